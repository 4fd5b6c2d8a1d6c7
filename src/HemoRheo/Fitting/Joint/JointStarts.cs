namespace HemoRheo;

/// <summary>Where a joint fit starts: the mean of the curves' own fits, and where that fails the fits of single curves, and what the laws guess.</summary>
internal static class JointStarts
{
    /// <summary>Solves from one start after the other until one converges; after a failure of the first, the lowest sum of squares of the others counts, whatever the order of the curves.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="alone">The curves' own fits with the same laws; null where these are not to be asked.</param>
    public static JointSolution Solve(JointProblem problem, IReadOnlyList<FittedLaw>? alone)
    {
        double[][] fits = alone is null ? [] : [.. alone.Where(fit => fit.Usable).Select(fit => fit.Scaled.ToArray())];
        var guesses = Guesses(problem);
        var own = Enumerable.Range(0, guesses.Length).Select(l => alone?[l].Usable == true ? alone[l].Scaled.ToArray() : guesses[l]).ToArray();
        var first = JointSolver.Solve(problem, Start(problem, fits.Length > 0 ? fits : guesses, own));
        if (first.End.Converged) return first;
        JointSolution? best = null;
        foreach (var other in fits.Select(fit => (double[][])[fit]).Append(guesses))
        {
            var solution = JointSolver.Solve(problem, Start(problem, other, own));
            if (solution.End.Converged && !(solution.ChiSquare >= best?.ChiSquare)) best = solution;
        }

        return best ?? first;
    }

    /// <summary>Shared unknowns at the mean of some sets of parameters, each curve's own where its own set has them, factors at the mean ratio of readings to laws.</summary>
    private static double[] Start(JointProblem problem, double[][] shared, double[][] own)
    {
        var start = new double[problem.Columns.Length];
        for (var l = 0; l < problem.Curves.Length; l++)
        {
            var places = problem.Curves[l].Places;
            for (var k = 0; k < places.Length; k++)
            {
                var column = problem.Columns[places[k]];
                start[places[k]] = column.Curve is null ? Mean(shared.Select(set => set[k]), column.Wall) : Mean([own[l][k]], column.Wall);
            }
        }

        if (problem.FirstFactor < start.Length) Factors(problem, start);
        return start;
    }

    /// <summary>The mean of what is finite; the bound where all are held there.</summary>
    private static double Mean(IEnumerable<double> values, JointWall? wall)
    {
        double[] finite = [.. values.Where(double.IsFinite)];
        return finite.Length > 0 ? finite.Average() : wall?.Bound ?? 0;
    }

    private static void Factors(JointProblem problem, double[] start)
    {
        var stresses = new double[problem.Points];
        problem.Evaluate(start, stresses, new double[problem.Points * start.Length]);
        var ratios = new double[problem.Curves.Length];
        var from = 0;
        for (var l = 0; l < ratios.Length; l++)
        {
            var points = problem.Curves[l].Points;
            ratios[l] = Enumerable.Range(from, points).Average(i => Math.Log(problem.Stresses[i] / stresses[i]));
            from += points;
        }

        var mean = ratios.Average();
        for (var c = problem.FirstFactor; c < start.Length; c++) start[c] = ratios[c - problem.FirstFactor] - mean;
    }

    private static double[][] Guesses(JointProblem problem) => [.. problem.Curves.Select(curve => Fits.StartOf(curve.Law, curve.Data))];
}
