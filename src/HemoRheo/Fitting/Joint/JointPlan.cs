namespace HemoRheo;

/// <summary>What is to be fitted together, and how.</summary>
internal sealed class JointPlan
{
    /// <summary>The curves.</summary>
    public required IReadOnlyList<FlowCurve> Curves { get; init; }

    /// <summary>One law a curve, with the same parameters.</summary>
    public required IReadOnlyList<FlowLaw> Laws { get; init; }

    /// <summary>One error model a curve.</summary>
    public required IReadOnlyList<ErrorModel> Errors { get; init; }

    /// <summary>Names of the parameters that the curves share.</summary>
    public required IReadOnlyCollection<string> Shared { get; init; }

    /// <summary>Whether each curve has a loading factor.</summary>
    public bool WithFactors { get; init; }

    /// <summary>The law that a curve alone is fitted with, for the test of what is shared; null for its law of the joint fit.</summary>
    public FlowLaw? Alone { get; init; }

    /// <summary>Where a shared parameter of this name runs to its bound, for laws without a limiting case of their own.</summary>
    public IReadOnlyDictionary<string, JointWall> Walls { get; init; } = new Dictionary<string, JointWall>();

    /// <summary>How many unknowns are a curve's own.</summary>
    public int OwnParameters => Laws[0].Parameters.Count - Shared.Count + (WithFactors ? 1 : 0);

    /// <summary>The same plan for some of its curves.</summary>
    public JointPlan Of(IReadOnlyList<int> members) => new()
    {
        Curves = [.. members.Select(i => Curves[i])],
        Laws = [.. members.Select(i => Laws[i])],
        Errors = [.. members.Select(i => Errors[i])],
        Shared = Shared,
        WithFactors = WithFactors,
        Alone = Alone,
        Walls = Walls,
    };

    /// <summary>The problem to solve: shared unknowns first, then each curve's own, then the factors, the last of which is minus the sum of the others.</summary>
    public JointProblem ToProblem()
    {
        var data = Curves.Select((curve, l) => CurveData.Of(curve, Laws[l], Errors[l])).ToArray();
        var columns = new List<JointColumn>();
        var places = Laws.Select(law => new int[law.Parameters.Count]).ToArray();
        var parameters = Laws[0].Parameters;
        for (var k = 0; k < parameters.Count; k++)
        {
            if (!Shared.Contains(parameters[k].Name)) continue;
            foreach (var place in places) place[k] = columns.Count;
            columns.Add(new(parameters[k], null, WallOf(Laws[0], k, data.Min(one => one.LowestStress))));
        }

        for (var l = 0; l < Laws.Count; l++)
        {
            for (var k = 0; k < parameters.Count; k++)
            {
                if (Shared.Contains(parameters[k].Name)) continue;
                places[l][k] = columns.Count;
                columns.Add(new(Laws[l].Parameters[k], l, WallOf(Laws[l], k, data[l].LowestStress)));
            }
        }

        var firstFactor = columns.Count;
        if (WithFactors) columns.AddRange(Enumerable.Range(0, Curves.Count - 1).Select(l => new JointColumn(LoadingFactor.Parameter, l, null)));
        JointCurve[] curves = [.. Curves.Select((_, l) => new JointCurve(Laws[l], data[l], places[l], Contrast(l)))];
        return new(curves, [.. columns], firstFactor);
    }

    private double[] Contrast(int curve)
    {
        if (!WithFactors) return [];
        var contrast = new double[Curves.Count - 1];
        if (curve < contrast.Length) contrast[curve] = 1;
        else Array.Fill(contrast, -1);
        return contrast;
    }

    private JointWall? WallOf(FlowLaw law, int parameter, double lowestStress) =>
        law.Boundary?.Parameter == parameter ? JointWall.Of(law, lowestStress) : Walls.GetValueOrDefault(law.Parameters[parameter].Name);
}
