namespace HemoRheo;

/// <summary>Up to four curves solved side by side, one a lane. One group serves one thread, again and again, without allocating; only the outcomes that are read are new.</summary>
internal sealed class LaneGroup
{
    /// <summary>Smallest pivot of the normal equations with which a lane is trusted; the general path takes over below.</summary>
    private const double SmallestPivot = 1e-8;

    private static readonly ThreadLocal<LaneGroup> Own = new(() => new());

    private readonly LaneProblem _problem = new();
    private readonly LaneSolver _solver = new();
    private readonly double[] _lowest = new double[Lane.Count];
    private readonly Lane[] _inverse = new Lane[LaneDual.Slopes * LaneDual.Slopes];
    private readonly Lane[] _response = new Lane[LaneDual.Slopes];
    private int? _held;

    private LaneGroup()
    {
    }

    public static LaneGroup OfThisThread => Own.Value!;

    /// <summary>Solves curves from given starts, and gives one outcome a curve.</summary>
    /// <param name="law">The law.</param>
    /// <param name="curves">One to four curves.</param>
    /// <param name="starts">Starts on the fitting scale, one a curve.</param>
    /// <param name="held">Number of the parameter that is held at its start; null to fit all.</param>
    public static LaneOutcome[] Outcomes(FlowLaw law, ReadOnlySpan<CurveData> curves, ReadOnlySpan<double[]> starts, int? held = null)
    {
        var group = OfThisThread;
        group.Begin(law, curves, held);
        for (var lane = 0; lane < Lane.Count; lane++) group.Put(lane, At(curves, lane), At(starts, lane));
        group.Solve(law);
        var outcomes = new LaneOutcome[curves.Length];
        for (var lane = 0; lane < outcomes.Length; lane++) outcomes[lane] = group.Outcome(lane, curves[lane]);
        return outcomes;
    }

    /// <summary>Makes room for curves; every lane must then be put.</summary>
    public void Begin(FlowLaw law, ReadOnlySpan<CurveData> curves, int? held = null)
    {
        var points = 0;
        foreach (var curve in curves) points = Math.Max(points, curve.Rates.Length);
        Begin(law, points, curves[0].Deviations is not null, held);
    }

    /// <summary>Makes room for curves; every lane must then be put.</summary>
    public void Begin(FlowLaw law, int points, bool deviationsAreGiven, int? held = null)
    {
        _held = held;
        _problem.Begin(points, law.Parameters.Count, deviationsAreGiven);
        if (held is { } parameter) _problem.Hold(parameter);
    }

    public void Put(int lane, CurveData curve, ReadOnlySpan<double> start)
    {
        _problem.Put(lane, curve.Rates, curve.Stresses, start, curve.Errors.Relative, curve.Errors.Floor.Pascals, curve.Deviations);
        _lowest[lane] = curve.LowestStress;
    }

    public void Put(int lane, ReadOnlySpan<double> rates, ReadOnlySpan<double> stresses, ErrorModel errors, ReadOnlySpan<double> start)
    {
        _problem.Put(lane, rates, stresses, start, errors.Relative, errors.Floor.Pascals);
        _lowest[lane] = Lowest(stresses);
    }

    /// <summary>Solves one curve in all lanes.</summary>
    public void SolveAlone(FlowLaw law, CurveData curve, ReadOnlySpan<double> start, int? held = null)
    {
        Begin(law, new(in curve), held);
        for (var lane = 0; lane < Lane.Count; lane++) Put(lane, curve, start);
        Solve(law);
    }

    public void Solve(FlowLaw law)
    {
        if (law.Boundary is { } boundary && _held is null) _problem.Fence(boundary.Parameter, WallOf(law, boundary, new(_lowest[0], _lowest[1], _lowest[2], _lowest[3])));
        _solver.Solve(law, _problem);
    }

    /// <summary>Whether the numbers of a lane stand as they are.</summary>
    public bool IsGood(int lane)
    {
        var end = _solver.Ends[lane];
        return end.Converged && !end.AtWall && _solver.LeastPivot[lane] >= SmallestPivot;
    }

    /// <summary>How a lane ended.</summary>
    public LaneEnd EndOf(int lane) => _solver.Ends[lane];

    /// <summary>Sum of squares of a lane.</summary>
    public double ChiSquareOf(int lane) => _solver.ChiSquare[lane];

    /// <summary>Writes the estimates of a lane, on the fitting scale.</summary>
    public void Estimates(int lane, Span<double> scaled)
    {
        for (var k = 0; k < scaled.Length; k++) scaled[k] = _solver.Estimates[k][lane];
    }

    /// <summary>The scaled value at which a curve's parameter has run to its bound.</summary>
    public static double WallOf(FlowLaw law, CurveData curve) =>
        law.Boundary is { } boundary ? WallOf(law, boundary, new(curve.LowestStress))[0] : double.NegativeInfinity;

    private static Lane WallOf(FlowLaw law, LawBoundary boundary, Lane lowestStress) => law.Parameters[boundary.Parameter].ToScaled(boundary.WallAt(lowestStress));

    /// <summary>Everything there is to say of a lane.</summary>
    public LaneOutcome Outcome(int lane, CurveData curve)
    {
        var size = _problem.Size;
        var inverse = _inverse.AsSpan(0, size * size);
        var response = _response.AsSpan(0, size);
        _solver.Inverse(inverse);
        _solver.Response(response);
        var residuals = new double[curve.Rates.Length];
        for (var i = 0; i < residuals.Length; i++) residuals[i] = _solver.Residual(i)[lane];
        var end = _solver.Ends[lane];
        return new(new(Column(_solver.Estimates, lane), Column(inverse, lane), Column(response, lane), residuals, _solver.ChiSquare[lane], end.Said(), _held), end.AtWall, IsGood(lane));
    }

    private static double Lowest(ReadOnlySpan<double> stresses)
    {
        var lowest = double.PositiveInfinity;
        foreach (var stress in stresses) lowest = Math.Min(lowest, stress);
        return lowest;
    }

    private static double[] Column(ReadOnlySpan<Lane> lanes, int lane)
    {
        var column = new double[lanes.Length];
        for (var i = 0; i < column.Length; i++) column[i] = lanes[i][lane];
        return column;
    }

    /// <summary>Lanes without a curve of their own repeat the last one.</summary>
    private static T At<T>(ReadOnlySpan<T> list, int lane) => list[Math.Min(lane, list.Length - 1)];
}
