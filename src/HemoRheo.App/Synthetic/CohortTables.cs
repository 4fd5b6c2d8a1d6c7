namespace HemoRheo.App.Synthetic;

/// <summary>The tables beside the exports, as a lab would keep them: hematocrit and plasma viscosity with their errors of measurement.</summary>
internal sealed class CohortTables(long seed, TrueInstrument instrument)
{
    private const int PlasmaTemperature = 37;

    /// <summary>The people table.</summary>
    public static string People(IEnumerable<PlannedSample> samples) =>
        "person,group\n" + string.Concat(samples.Where(sample => sample.Visit == 1).Select(sample => $"{sample.Person},{Group(sample)}\n"));

    /// <summary>Code of a sample's group.</summary>
    public static string Group(PlannedSample sample) => sample.Second ? CohortPlan.SecondGroup : CohortPlan.Controls;

    /// <summary>The samples table.</summary>
    public string Samples(IEnumerable<PlannedSample> samples, IReadOnlyDictionary<string, TrueBlood> truth) =>
        "sample,person,visit,drawn_at,hematocrit [L/L],counter,plasma_viscosity [mPa.s],plasma_temperature [°C],plasma_instrument,fibrinogen [g/L]\n"
        + string.Concat(samples.Select(sample => Row(sample, truth[sample.Sample]) + "\n"));

    private string Row(PlannedSample sample, TrueBlood blood)
    {
        var stream = RandomStream.Of(seed, $"beside {sample.Sample}", 1);
        var hematocrit = blood.Hematocrit + instrument.CounterError + TrueSizes.Hematocrit * stream.Normal();
        var plasma = blood.Plasma * Math.Exp(TrueSizes.Plasma * stream.Normal());
        if (!sample.PlasmaByCapillary) plasma *= OnTheRheometer(sample.StartedAt[0]);
        var fibrinogen = blood.Fibrinogen * Math.Exp(0.04 * stream.Normal());
        return string.Join(
            ',',
            sample.Sample,
            sample.Person,
            Written.Whole(sample.Visit),
            Written.Moment(sample.DrawnAt),
            Written.Point(hematocrit, 3),
            CohortPlan.Counter,
            Written.Point(1000 * plasma, 4),
            Written.Whole(PlasmaTemperature),
            sample.PlasmaByCapillary ? CohortPlan.Capillary : CohortPlan.Instrument,
            Written.Point(fibrinogen, 2));
    }

    private double OnTheRheometer(DateTimeOffset moment) =>
        Math.Exp(instrument.BiasAt(moment) + instrument.DayError(moment) - TrueSizes.PlasmaPerKelvin * instrument.ThermometerError);
}
