namespace HemoRheo.Benchmarks.FittedIntervals;

/// <summary>A named truth and the law that is fitted to its curves.</summary>
/// <param name="Name">Name of the truth.</param>
/// <param name="Truth">The law that makes the curves.</param>
/// <param name="Numbers">Its parameters, natural scale.</param>
/// <param name="Fitted">The law that is fitted; its own parameters are held against the truth where they mean the same.</param>
internal sealed record IntervalCase(string Name, FlowLaw Truth, double[] Numbers, FlowLaw Fitted)
{
    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    private const double Relative = 0.01;
    private const double Floor = 0.0003;

    /// <summary>Normal blood, plasma, and anemic blood with almost no yield stress; every law on curves of its own kind.</summary>
    public static IReadOnlyList<IntervalCase> All { get; } =
    [
        new("normal blood", FlowLaw.Casson, [0.005, 0.0033], FlowLaw.Casson),
        new("normal blood", FlowLaw.Quemada, [0.0031, 2, 0.2], FlowLaw.Quemada),
        new("anemic blood", FlowLaw.Casson, [0.00002, 0.002], FlowLaw.Casson),
        new("anemic blood", FlowLaw.Quemada, [0.0019, 0.5, 0.6], FlowLaw.Quemada),
        new("plasma", FlowLaw.Newtonian, [0.0013], FlowLaw.Newtonian),
        new("plasma", FlowLaw.Newtonian, [0.0013], FlowLaw.Casson),
        new("plasma", FlowLaw.Newtonian, [0.0013], FlowLaw.Quemada),
    ];

    /// <summary>What is asked, with its true value, SI; NaN where the truth has no such number.</summary>
    public IReadOnlyList<(string Name, Func<FittedLaw, FitFunction> Function, double Value)> Quantities =>
    [
        .. Fitted.Parameters.Select((parameter, k) => (parameter.Name, (Func<FittedLaw, FitFunction>)(fit => FitFunction.Of(parameter, k)), Value: Known(k))),
        .. new[] { 1.0, 10, 100 }.Select(rate => ($"viscosity at {rate} 1/s", (Func<FittedLaw, FitFunction>)(fit => MeasurandIntervals.FunctionOf(fit, Measurand.Viscosity(rate.PerSecond()))), Stress(rate) / rate)),
    ];

    /// <summary>Error sizes of the curves: known, or stated twice as large and known up to scale.</summary>
    public static ErrorModel Errors(bool known) => known ? ErrorModel.Known(Relative, ShearStress.FromPascals(Floor)) : ErrorModel.UpToScale(2 * Relative, ShearStress.FromPascals(2 * Floor));

    /// <summary>One curve; drawn again where noise of the floor takes a stress below zero.</summary>
    public FlowCurve Draw(int number)
    {
        var stream = RandomStream.Of(20261201, $"{Name}/{Fitted}", number);
        while (true)
        {
            double[] stresses = [.. Rates.Select(rate => Stress(rate) * (1 + Relative * stream.Normal()) + Floor * stream.Normal())];
            if (stresses.All(stress => stress > 0)) return FlowCurve.Of(Rates, stresses, $"{Name}-{number}");
        }
    }

    private double Stress(double rate) => Truth.Stress(rate.PerSecond(), Numbers).Pascals;

    private double Known(int parameter) =>
        Truth == Fitted ? Numbers[parameter]
        : Fitted == FlowLaw.Casson ? (parameter == 0 ? 0 : Numbers[0])
        : double.NaN;
}
