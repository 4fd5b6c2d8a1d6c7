using System.Runtime.InteropServices;

namespace HemoRheo;

/// <summary>Up to four least-squares problems side by side, in arrays that are filled again and again and grow only when a problem is larger than any before.</summary>
/// <remarks>Variance of a datum: (relative * model)^2 + floor^2, at the fitted model; or given, point by point.</remarks>
internal sealed class LaneProblem
{
    private readonly Lane[] _start = new Lane[LaneDual.Slopes];
    private readonly Lane[] _free = new Lane[LaneDual.Slopes];
    private readonly Lane[] _wall = new Lane[LaneDual.Slopes];
    private Lane[] _x = [];
    private Lane[] _y = [];
    private Lane[] _present = [];
    private Lane[] _weights = [];
    private Lane _relative;
    private Lane _floor;

    /// <summary>Points of the longest data set.</summary>
    public int Points { get; private set; }

    /// <summary>Parameters.</summary>
    public int Size { get; private set; }

    /// <summary>Predictor, point by point.</summary>
    public ReadOnlySpan<Lane> X => _x.AsSpan(0, Points);

    /// <summary>Data, point by point.</summary>
    public ReadOnlySpan<Lane> Y => _y.AsSpan(0, Points);

    /// <summary>Mask: the point exists.</summary>
    public ReadOnlySpan<Lane> Present => _present.AsSpan(0, Points);

    /// <summary>Weights that are given, zero where no point exists; empty where they follow from the fitted model.</summary>
    public ReadOnlySpan<Lane> Weights => WeightsAreGiven ? _weights.AsSpan(0, Points) : default;

    /// <summary>Where the parameters start.</summary>
    public ReadOnlySpan<Lane> Start => _start.AsSpan(0, Size);

    /// <summary>Mask a parameter: it is fitted; otherwise it stays at its start.</summary>
    public ReadOnlySpan<Lane> Free => _free.AsSpan(0, Size);

    /// <summary>A parameter below this ends its lane.</summary>
    public ReadOnlySpan<Lane> Wall => _wall.AsSpan(0, Size);

    /// <summary>Relative standard deviation.</summary>
    public Lane Relative => _relative;

    /// <summary>Floor of the standard deviation.</summary>
    public Lane Floor => _floor;

    /// <summary>Whether each point's standard deviation is given, and does not follow from the fitted model.</summary>
    public bool WeightsAreGiven { get; private set; }

    /// <summary>Whether every parameter of every lane is fitted.</summary>
    public bool AllAreFree { get; private set; }

    /// <summary>Begins anew; every lane must then be put.</summary>
    /// <param name="points">Points of the longest data set.</param>
    /// <param name="size">Parameters, at most five.</param>
    /// <param name="weightsAreGiven">Whether standard deviations are given point by point.</param>
    public void Begin(int points, int size, bool weightsAreGiven = false)
    {
        if (_x.Length < points)
        {
            var room = Math.Max(points, 2 * _x.Length);
            (_x, _y, _present, _weights) = (new Lane[room], new Lane[room], new Lane[room], new Lane[room]);
        }

        (Points, Size, WeightsAreGiven, AllAreFree) = (points, size, weightsAreGiven, true);
        Array.Fill(_free, Lane.Everywhere);
        Array.Fill(_wall, new(double.NegativeInfinity));
    }

    /// <summary>Puts a data set into a lane. Points that it does not have repeat its last one and count nothing.</summary>
    public void Put(int lane, ReadOnlySpan<double> x, ReadOnlySpan<double> y, ReadOnlySpan<double> start, double relative, double floor, ReadOnlySpan<double> deviations = default)
    {
        var xs = Numbers(_x);
        var ys = Numbers(_y);
        var present = Numbers(_present);
        var weights = Numbers(_weights);
        for (var i = 0; i < Points; i++)
        {
            var from = Math.Min(i, x.Length - 1);
            var to = Lane.Count * i + lane;
            (xs[to], ys[to]) = (x[from], y[from]);
            present[to] = i < x.Length ? BitConverter.Int64BitsToDouble(-1) : 0;
            if (WeightsAreGiven) weights[to] = i < x.Length ? 1 / (deviations[from] * deviations[from]) : 0;
        }

        for (var k = 0; k < Size; k++) Numbers(_start)[Lane.Count * k + lane] = start[k];
        Numbers(ref _relative)[lane] = relative;
        Numbers(ref _floor)[lane] = floor;
    }

    /// <summary>Holds a parameter at its start, in every lane.</summary>
    public void Hold(int parameter)
    {
        _free[parameter] = Lane.Zero;
        AllAreFree = false;
    }

    /// <summary>Ends a lane when a parameter runs below its wall.</summary>
    public void Fence(int parameter, Lane wall) => _wall[parameter] = wall;

    private static Span<double> Numbers(Span<Lane> lanes) => MemoryMarshal.Cast<Lane, double>(lanes);

    private static Span<double> Numbers(ref Lane lane) => MemoryMarshal.Cast<Lane, double>(new Span<Lane>(ref lane));
}
