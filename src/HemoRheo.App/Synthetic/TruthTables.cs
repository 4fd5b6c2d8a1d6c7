namespace HemoRheo.App.Synthetic;

/// <summary>What is true of the cohort. The analysis never reads these tables; tests do.</summary>
internal static class TruthTables
{
    private static readonly int[] StandardRates = [1, 10, 100];

    /// <summary>True parameters of every sample.</summary>
    public static string Parameters(IEnumerable<PlannedSample> samples, IReadOnlyDictionary<string, TrueBlood> truth) =>
        "sample,person,group,visit,week,hematocrit_L_per_L,plasma_viscosity_mPa_s,fibrinogen_g_per_L,viscosity_at_infinite_shear_mPa_s,critical_rate_per_s,ratio\n"
        + string.Concat(samples.Select(sample => (Sample: sample, Blood: truth[sample.Sample])).Select(one =>
            $"{one.Sample.Sample},{one.Sample.Person},{CohortTables.Group(one.Sample)},{Written.Whole(one.Sample.Visit)},{Written.Whole(one.Sample.Week)},"
            + $"{Written.Point(one.Blood.Hematocrit, 6)},{Written.Point(1000 * one.Blood.Plasma, 6)},{Written.Point(one.Blood.Fibrinogen, 4)},"
            + $"{Written.Point(1000 * one.Blood.InfiniteShear, 6)},{Written.Point(one.Blood.CriticalRate, 6)},{Written.Point(one.Blood.Ratio, 6)}\n"));

    /// <summary>True viscosities of every sample at 37 degC, at its own hematocrit and moved to the standard one by the plasma power rule.</summary>
    public static string Viscosities(IEnumerable<PlannedSample> samples, IReadOnlyDictionary<string, TrueBlood> truth) =>
        "sample,shear_rate_per_s,native_mPa_s,standard_mPa_s\n"
        + string.Concat(samples.SelectMany(_ => StandardRates, (sample, rate) => (sample.Sample, Rate: rate, Blood: truth[sample.Sample])).Select(one =>
            $"{one.Sample},{Written.Whole(one.Rate)},{Written.Point(1000 * one.Blood.ViscosityAt(one.Rate), 6)},"
            + $"{Written.Point(1000 * one.Blood.StandardViscosityAt(one.Rate, TrueSizes.StandardHematocrit), 6)}\n"));

    /// <summary>True effect of the second group beyond hematocrit: mean over all people, at first visit, of ln viscosity with it less without it, all else equal.</summary>
    public static string Effects(IReadOnlyList<PlannedSample> samples, IReadOnlyDictionary<string, TrueBlood> truth) =>
        "shear_rate_per_s,ln_ratio_altitude_to_lowland\n"
        + string.Concat(StandardRates.Select(rate => $"{Written.Whole(rate)},{Written.Point(samples.Where(sample => sample.Visit == 1).Average(sample => Effect(sample, truth[sample.Sample], rate)), 6)}\n"));

    /// <summary>The instrument's true error at every loading, days included.</summary>
    public static string Instrument(IEnumerable<PlannedSample> samples, TrueInstrument instrument) =>
        "recording,loading,started_at,ln_error\n"
        + string.Concat(Enumerable.Range(1, CohortPlan.Weeks).Select(week => InstrumentRow(Bench.CheckName(week), 1, CohortPlan.CheckAt(week), instrument)))
        + string.Concat(samples.SelectMany(sample => sample.StartedAt.Select((moment, i) => InstrumentRow(sample.Sample, i + 1, moment, instrument))));

    /// <summary>What was put wrong on purpose, and the samples it puts in doubt.</summary>
    public static string Faults(IReadOnlyList<PlannedSample> samples) =>
        "what,where,from,until\n"
        + $"instrument reads {Written.Whole((int)Math.Round(100 * TrueSizes.Change))} % too high,{CohortPlan.Instrument},{Written.Moment(CohortPlan.ChangedAt)},{Written.Moment(CohortPlan.AdjustedAt)}\n"
        + $"check fails,{Bench.CheckName(CohortPlan.FailedWeek)},{Written.Moment(CohortPlan.CheckAt(CohortPlan.FailedWeek))},\n"
        + string.Concat(samples.Where(sample => sample.Week == CohortPlan.FailedWeek - 1).Select(sample => $"measured between the last passed check and the failed one,{sample.Sample},,\n"))
        + string.Concat(samples.Where(sample => sample.Week == CohortPlan.FailedWeek).Select(sample => $"measured after the failed check,{sample.Sample},,\n"))
        + string.Concat(samples.Where(sample => sample.Fault != PlantedFault.None).Select(sample => $"{InWords(sample.Fault)},{sample.Sample},,\n"));

    private static double Effect(PlannedSample sample, TrueBlood blood, int rate)
    {
        var with = sample.Second ? blood : TruePopulation.WithGroupEffect(blood);
        var without = sample.Second ? TruePopulation.WithoutGroupEffect(blood) : blood;
        return Math.Log(with.ViscosityAt(rate) / without.ViscosityAt(rate));
    }

    private static string InstrumentRow(string recording, int loading, DateTimeOffset moment, TrueInstrument instrument) =>
        $"{recording},{Written.Whole(loading)},{Written.Moment(moment)},{Written.Point(instrument.BiasAt(moment) + instrument.DayError(moment), 6)}\n";

    private static string InWords(PlantedFault fault) => fault switch
    {
        PlantedFault.TemperatureExcursion => "temperature excursion",
        PlantedFault.TooOld => "measured too long after the draw",
        PlantedFault.FileCut => "export file cut in the middle",
        _ => "none",
    };
}
