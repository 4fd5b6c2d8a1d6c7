using MathNet.Numerics.LinearAlgebra;

namespace HemoRheo;

/// <summary>Pools the scatter between loadings over a study's replicates.</summary>
/// <remarks>
/// Covariance S = A - V kept between A/10 and A, with A the replicates' pooled covariance about their means and V that of their fits, on A's range.
/// The floor keeps a study of few replicates from claiming no loading error at all.
/// </remarks>
internal static class LoadingPool
{
    private const double Floor = 0.1;
    private const int FewReplicates = 3;

    // A relative scatter below 1e-9 is rounding: recordings that were entered twice, not blood that was loaded twice.
    private const double NoVariance = 1e-18;

    /// <summary>The scatter of loadings for measurands taken together.</summary>
    /// <param name="law">Name of the law.</param>
    /// <param name="measurands">The measurands, all logarithmic.</param>
    /// <param name="samples">For each sample with at least two loadings, one value a measurand for each loading.</param>
    /// <param name="declared">Declared relative scatter; null when not declared.</param>
    public static LoadingScatter Pool(string law, Items<Measurand> measurands, IReadOnlyList<FitValueSet[]> samples, double? declared)
    {
        var df = samples.Sum(loadings => loadings.Length - 1);
        if (df == 0) return Declared(law, measurands, declared, "no sample has two loadings without a fault");

        var size = measurands.Count;
        var scatter = Matrix<double>.Build.Dense(size, size);
        var fits = Matrix<double>.Build.Dense(size, size);
        foreach (var loadings in samples)
        {
            var mean = loadings.Select(set => set.X).Aggregate((a, b) => a + b) / loadings.Length;
            foreach (var set in loadings)
            {
                scatter += (set.X - mean).OuterProduct(set.X - mean);
                fits += (loadings.Length - 1.0) / loadings.Length * set.Columns * set.Columns.Transpose();
            }
        }

        if (scatter.Diagonal().Maximum() / df <= NoVariance)
        {
            var copies = PoolingFindings.LoadingsAlike.At(Where.Nowhere, $"{law}, {measurands[0].Name}{(size > 1 ? " and others" : "")}: {df + samples.Count} loadings of {samples.Count} samples differ by nothing.");
            var instead = Declared(law, measurands, declared, "replicate loadings differ by nothing");
            return instead with { Findings = instead.Findings.With([copies]) };
        }

        var columns = Columns(scatter / df, fits / df, df, out var atFloor);
        var name = $"{law}, {measurands[0].Name}{(size > 1 ? " and others" : "")}";
        var findings = new List<Finding>();
        if (atFloor > 0) findings.Add(PoolingFindings.LoadingFloor.At(Where.Nowhere, $"{name}: {atFloor} of {columns.Count} patterns across the measurands are held at the floor; pooled from {df} degrees of freedom."));
        if (df < FewReplicates) findings.Add(PoolingFindings.LoadingFew.At(Where.Nowhere, $"{name}: the scatter between loadings rests on {df} degrees of freedom, so intervals are very wide.", df, FewReplicates));
        return new(law, measurands, columns.ToItems(), df, findings.ToItems());
    }

    private static List<ScatterColumn> Columns(Matrix<double> scatter, Matrix<double> fits, int df, out int atFloor)
    {
        var outer = scatter.Evd(Symmetricity.Symmetric);
        var roots = outer.EigenValues.Real();
        var kept = Enumerable.Range(0, roots.Count).Where(i => roots[i] > 1e-14 * roots.Maximum()).ToArray();
        var half = Matrix<double>.Build.DenseOfColumnVectors(kept.Select(i => outer.EigenVectors.Column(i) * Math.Sqrt(roots[i])));
        var inverse = Matrix<double>.Build.DenseOfColumnVectors(kept.Select(i => outer.EigenVectors.Column(i) / Math.Sqrt(roots[i])));
        var inner = (inverse.Transpose() * (scatter - fits) * inverse).Evd(Symmetricity.Symmetric);
        atFloor = 0;
        var columns = new List<ScatterColumn>();
        for (var k = 0; k < kept.Length; k++)
        {
            var share = inner.EigenValues[k].Real;
            if (share < Floor) atFloor++;
            share = Math.Clamp(share, Floor, 1);
            columns.Add(new((half * inner.EigenVectors.Column(k) * Math.Sqrt(share)).ToItems(), df * share * share));
        }

        return columns;
    }

    private static LoadingScatter Declared(string law, Items<Measurand> measurands, double? declared, string why)
    {
        var columns = declared is { } scatter ? [new ScatterColumn(Enumerable.Repeat(scatter, measurands.Count).ToItems(), double.PositiveInfinity)] : Items<ScatterColumn>.None;
        var finding = declared is { } known
            ? PoolingFindings.LoadingDeclared.At(Where.Nowhere, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{law}: {why}; the declared scatter of {100 * known:G3} % between loadings is used."), known)
            : PoolingFindings.LoadingUnknown.At(Where.Nowhere, $"{law}: {why} and no scatter between loadings is declared.");
        return new(law, measurands, columns, 0, [finding]);
    }
}
