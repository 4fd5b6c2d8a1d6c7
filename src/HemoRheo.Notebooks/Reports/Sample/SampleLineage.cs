namespace HemoRheo.Notebooks;

/// <summary>The chain of a sample's numbers, back to lines of files.</summary>
internal static class SampleLineage
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition, JudgedSample sample) => Page.Section("lineage", "Where the numbers come from", Markup.Of($"""
        {sample.Result.Loadings.Select(loading => Chain(edition, loading))}
        <p class="quiet">Settings: {edition.Study.FileName}, SHA-256 <code>{edition.Record.Settings}</code>. {(sample.Result.Record is { } record ? $"Sample record: {record.Where}." : "")}</p>
        """));

    private static Markup Chain(Edition edition, LoadingResult loading)
    {
        var fit = loading.Fits.FirstOrDefault(fit => fit.Law.Name == edition.Law);
        return Markup.Of($"""
            <h3>Loading {loading.Recording.Loading}</h3>
            <ol class="chain">
            <li><b>value</b> by the {edition.Law} law, within {(loading.Curve.KeptRates is { } kept ? $"{Rounding.Digits(kept.Lower, 3)} to {Rounding.Digits(kept.Upper, 3)} 1/s" : "no kept shear rate")}</li>
            <li><b>fit</b> {(fit is null ? "none" : $"{Words.Of(fit.Convergence.Reason)} after {Figures.Count(fit.Convergence.Iterations, "iteration")} ({fit.Convergence.Message}); chi-square {(double.IsFinite(fit.Fit.ChiSquare) ? Figures.Fixed(fit.Fit.ChiSquare, 1) : Figures.Nothing)} for {fit.Fit.DegreesOfFreedom} degrees of freedom")}</li>
            <li><b>points</b> {Figures.Count(loading.Curve.Points.Count, "point")} kept, {loading.Curve.SetAside.Count} set aside, {Words.Of(loading.Curve.Label.Ramp)} ramp{(loading.OtherRamp is { } other ? $"; {Words.Of(other.Label.Ramp)} ramp for hysteresis ({Figures.Count(other.Points.Count, "point")})" : "")}</li>
            <li><b>file</b> {Files(edition, loading)}</li>
            <li><b>instrument</b> {edition.InstrumentLink(loading.Recording.Instrument, "../")}{(loading.Recording.Geometry is { } geometry ? $", geometry {geometry}" : "")}: {Words.Of(loading.Standing.Status)}. {loading.Standing.Reason}{Period(loading.Standing.Period)}{Torque(loading.Curve.Torque)}</li>
            </ol>
            """);
    }

    private static Markup Files(Edition edition, LoadingResult loading)
    {
        var files = loading.Recording.Readings.GroupBy(reading => reading.Where.File).Select(file =>
        {
            var lines = file.Select(reading => reading.Where.Line).OfType<int>().ToArray();
            var read = edition.Results.Analyzed.Readings.Files.FirstOrDefault(known => known.Path == file.Key);
            return Markup.Of($"{file.Key}{(lines.Length == 0 ? "" : $", lines {lines.Min()} to {lines.Max()}")}{(read is null ? Markup.None : Markup.Of($" (layout {read.Layout ?? "none"}, SHA-256 <code>{Figures.Digest(read.Digest)}</code>)"))}").Text;
        });
        return new(string.Join("; ", files));
    }

    private static string Torque(TorqueTrust? torque) => torque is { BlankRun: { } run, Age: { } age }
        ? $" Torques rest on the {torque.Basis.Words()}, {run}{(torque.Basis == TorqueBasis.EarlierBlank ? $", {Figures.Fixed(age.TotalDays, 1)} days old" : "")}: floor {Rounding.Digits(1e6 * torque.Floor()!.Value, 3)} µN·m, zero {(torque.Corrected ? "corrected" : "not corrected")}."
        : "";

    private static string Period(InstrumentPeriod? period) => period is null
        ? " No correction applies."
        : $" Corrected by period {period.Number} ({string.Join(", ", period.Checks.Select(check => $"check {check.Name} of {Figures.Date(check.At)}"))}): {Figures.Signed(100 * (Math.Exp(period.Correction.X) - 1))} %.";
}
