namespace HemoRheo;

/// <summary>Every column that a table of this library may have, with its meaning and unit. One name means one thing everywhere.</summary>
public static class Glossary
{
    private static readonly Unit Rate = ShownUnits.PerSecond;
    private static readonly Unit Stress = ShownUnits.Millipascal;
    private static readonly Unit Thickness = ShownUnits.MillipascalSecond;
    private static readonly Unit Warmth = ShownUnits.DegreeCelsius;
    private static readonly Unit Share = ShownUnits.LiterPerLiter;
    private static readonly Unit Grams = new(Quantity.Concentration, "g/L", "g/L", 1);
    private static readonly Unit Seconds = new(Quantity.Time, "s", "s", 1);
    private static readonly Unit Days = new(Quantity.Time, "d", "d", 86400);
    private static readonly Unit Torque = new(Quantity.Torque, "µN·m", "uN.m", 1e-6);
    private static readonly Unit Percent = new(Quantity.Fraction, "%", "%", 0.01);

    /// <summary>All columns, by subject.</summary>
    public static Items<Column> All { get; } =
    [
        // Lineage: where a thing was read.
        new("file", "Path of the file below the study's folder."),
        new("line", "Line of the file, counted from 1."),
        new("column", "Column of the line, counted from 1."),
        new("layout", "Declared layout that the file was read by."),
        new("digest", "SHA-256 of the bytes, hexadecimal."),
        new("bytes", "Size of the file in bytes."),
        new("readings", "How many readings."),
        new("recordings", "How many recordings: fillings of the gap, of blood or of a calibration fluid."),
        new("where", "Where it is: file and line, or sample, loading and point."),

        // Findings.
        new("code", "Stable code of the finding."),
        new("severity", "How much the finding matters: note, warning or fault."),
        new("finding", "What was found, with numbers and units."),
        new("findings", "How many findings, or their codes."),
        new("usual cause", "What usually causes such a finding in the laboratory."),
        new("what to do", "What a person should do about it."),
        new("observed", "What was observed, in the unit that the finding names."),
        new("limit", "The limit it was held against, in the unit that the finding names."),

        // Who and when. Identifiers are pseudonyms.
        new("sample", "Pseudonym of the sample, or name of the check."),
        new("person", "Pseudonym of the person."),
        new("visit", "Number of the visit."),
        new("group", "Label of the group."),
        new("loading", "Number of the filling of the gap, counted from 1."),
        new("loadings", "How many fillings of the gap."),
        new("started at", "Date and time of the recording's start with offset, ISO 8601."),
        new("day", "Local date, ISO 8601."),

        // Readings and curves.
        new("point", "Number of the reading in its recording, counted from 1."),
        new("ramp", "Direction of the ramp of shear rates: up, down or unstated."),
        new("kept", "Whether the point takes part in fits."),
        new("set aside because", "Codes of the findings that keep the point out of fits."),
        new("shear rate", "Shear rate at the inner wall.", Rate),
        new("shear stress", "Shear stress at the inner wall, as read.", Stress),
        new("viscosity", "Apparent viscosity: shear stress over shear rate.", Thickness),
        new("elapsed", "Time since the recording's start.", Seconds),
        new("temperature", "Temperature of the sample as read.", Warmth),

        // Laws and fits.
        new("law", "Flow law the number comes from."),
        new("decides", "Whether values of this law are decided on."),
        new("parameter", "Parameter of the flow law."),
        new("symbol", "Symbol in the formula."),
        new("estimate", "Best estimate, in the unit beside it."),
        new("standard error", "Standard error of the estimate from its fit alone, in the unit beside it."),
        new("why no error", "Why there is no standard error."),
        new("at bound", "Whether the estimate lies at a bound of its range."),
        new("stop reason", "Why the fit ended."),
        new("chi-square", "Weighted sum of squared residuals."),
        new("probability", "Probability of a result as extreme or more if nothing but chance is at work."),
        new("usable", "Whether the fit ended well enough numerically for values to be taken from it; it does not say that the law fits."),
        new("curves", "How many curves."),
        new("curve", "Curve that the number belongs to, by sample and loading, or by its number from 0 where these are alike; all where curves fitted together share it."),
        new("fits", "Whether the law fits: yes, or no, for a single fit with what contradicts it, its own curve or the pooled evidence of the whole study."),
        new("pattern probability", "Probability of mean residuals as large at the same places along the curves if the law is right, whatever the size of the errors."),
        new("parameters", "Parameters that the data had to give: those of the law, and the size of the errors where it is not known."),
        new("points", "Points that took part in the fit."),
        new("estimates", "Estimates in words, each with the standard error of its fit (u) and its unit."),
        new("fitted stress", "Shear stress that the fitted law gives at the same shear rate.", Stress),
        new("residual", "Reading less law, in standard deviations of the error model."),
        new("lower end", "Lower end of an interval from one fit alone, in the unit beside it; empty where these shear rates leave the side open."),
        new("upper end", "Upper end of an interval from one fit alone, in the unit beside it; empty where these shear rates leave the side open."),
        new("answer", "What the interval says: closed, at most, at least, not identifiable, or no answer."),
        new("-2 log likelihood", "Twice the negative log likelihood of normal errors, the logarithms of their variances included."),
        new("AICc", "Akaike's criterion with the correction for few points; lower is better, and only differences count."),
        new("AIC", "Akaike's criterion summed over the curves of the study; lower is better, and only differences count. Where fits estimate the size of the errors, with the correction for few points."),
        new("difference", "AIC or AICc less that of the best law that fits."),
        new("difference error", "Standard error of the difference from its scatter between curves."),
        new("standing", "Where the law stands among the laws of the study on the evidence of all curves together."),
        new("weight", "Akaike weight: relative support among the laws compared, one in sum."),
        new("residual signs", "Signs of the residuals along the curve, from low rates to high ones."),
        new("residual correlation", "Correlation of neighboring residuals along the curve."),
        new("correlation probability", "Probability of a correlation as large or larger if the law is right and readings are independent."),
        new("against", "What contradicts the law, or why it takes no part."),
        new("general law", "Flow law of which the law is a special case."),
        new("special case", "Numbers of the general law at which it is the simple one."),
        new("statistic", "Chi-square where the size of the errors is known, F where it is estimated."),
        new("source", "Where the number, rule or contribution comes from."),

        // Values and their budget.
        new("measurand", "The quantity that is reported."),
        new("basis", "The hematocrit the value speaks of: native, or the study's standard by the plasma rule or by the study's slope."),
        new("value", "Best estimate, in the unit beside it."),
        new("unit", "Unit of the numbers in this row, as shown."),
        new("UCUM code", "Unit of the numbers in this row as its UCUM code."),
        new("lower", "Lower end of the 95 % interval with the whole budget, in the unit beside it."),
        new("upper", "Upper end of the 95 % interval with the whole budget, in the unit beside it."),
        new("interval", "Interval of 95 % with the whole budget, rounded, in the unit beside it."),
        new("standard uncertainty", "Combined standard uncertainty, in the unit beside it."),
        new("relative uncertainty", "Combined standard uncertainty relative to the value.", Percent),
        new("degrees of freedom", "Effective degrees of freedom; Inf where every variance is known."),
        new("interpolated", "The same quantity read off between the readings without a law, in the unit beside it."),
        new("decidable", "Whether the value may be decided on and summarized."),
        new("contribution", "Change of the value when this input is raised by one standard uncertainty, in the unit beside it."),
        new("relative contribution", "Change of the value, relative to it, when this input is raised by one standard uncertainty.", Percent),
        new("share", "Part of the variance that comes from this source.", Percent),
        new("shared", "Whether many samples share this source, so that a mean does not average it away."),

        // Budgets on the working scale: the natural logarithm of the SI number for viscosities and stresses, the SI number itself for other quantities.
        new("working value", "Best estimate on the working scale: natural logarithm of the SI number for viscosities, the SI number itself for quantities that may be negative."),
        new("working uncertainty", "Combined standard uncertainty on the working scale."),
        new("working contribution", "Signed change of the working value when this source is raised by one standard uncertainty."),
        new("kind", "Kind of the source of a contribution."),
        new("belongs to", "What the source belongs to; values that name the same one share its error."),
        new("variance estimate", "Variance estimate the contribution comes from; contributions of one estimate are right or wrong together. Empty where the variance is taken as known."),
        new("c fit", "Contribution of the fits of its loadings to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c loading", "Contribution of the scatter between loadings to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c calibration", "Contribution of the instrument's correction in its period to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c day", "Contribution of the instrument's day-to-day scatter to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c certificate", "Contribution of the calibration fluid's certificate to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c fluid beta", "Contribution of the calibration fluid's temperature coefficient to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c thermometer", "Contribution of the instrument's thermometer to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c blood beta", "Contribution of the temperature coefficient of blood to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c hematocrit", "Contribution of the sample's hematocrit to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c counter", "Contribution of the bias that all samples of the hematocrit counter share to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c plasma", "Contribution of the sample's plasma viscosity to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c torque zero", "Contribution of the torque zero of the day to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c slope", "Contribution of the study's slope against hematocrit to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c law", "Contribution of the choice among laws that the study's curves cannot part to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c bias", "Contribution of a known bias of the instrument that the study chose not to correct to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("c people", "Contribution of the scatter among people to the working value: signed where it is one source, else the root of the sum of squares; empty where it does not enter."),
        new("why not decidable", "Codes of the findings that keep the value from being decided on."),

        // Blood.
        new("hematocrit", "Volume fraction of red cells.", Share),
        new("counter", "Method or counter that measured the hematocrit."),
        new("fibrinogen", "Fibrinogen concentration of the plasma.", Grams),

        // Instruments and checks.
        new("instrument", "Name of the rheometer."),
        new("geometry", "Name of the measuring geometry."),
        new("check", "Name of the instrument check."),
        new("fluid", "Name of the calibration fluid."),
        new("lot", "Lot of the fluid's certificate."),
        new("measured", "Viscosity measured in the check.", Thickness),
        new("expected", "Certified viscosity, moved to the temperature of the check.", Thickness),
        new("relative error", "Measured over expected viscosity, less one.", Percent),
        new("error lower", "Lower end of the relative error's 95 % interval.", Percent),
        new("error upper", "Upper end of the relative error's 95 % interval.", Percent),
        new("relative limit", "Largest relative error that a check may show.", Percent),
        new("check outcome", "What the check says: passes, fails, or cannot tell."),
        new("probability within", "Probability that the error lies within the limit."),
        new("period", "Number of the instrument's period between calibrations, counted from 1."),
        new("checks", "How many checks."),
        new("torque rests on", "What the trust in torques rests on: blank run of the day, last blank run, declared floor, or nothing."),
        new("blank run", "Name of the blank run that the torque zero and noise are taken from; empty where there is none."),
        new("blank age", "Time from the blank run to the recording; below zero where the run was made later that day.", Days),
        new("torque floor", "Torque below which readings are set aside, the largest over all speeds; empty where it is not known.", Torque),
        new("torque zero", "Torque of the empty gap, the worst over all speeds; empty without a blank run.", Torque),
        new("torque zero uncertainty", "Standard uncertainty of that.", Torque),
        new("torque noise", "Standard deviation of one reading of the empty gap's torque.", Torque),
        new("zero corrected", "Whether the torque zero is taken from every torque."),
        new("status", "Instrument status: in order, in doubt, failed or unknown."),
        new("reason", "The reason, in one sentence."),
        new("entry", "Number of the entry in the instrument's log, counted from 1."),
        new("recorded at", "Date and time at which the entry was written, with offset, ISO 8601."),
        new("recorded by", "Who wrote the entry."),
        new("says", "What the entry says."),

        // Limits and verdicts.
        new("outcome", "Verdict: below, within, above or undecided; empty where the value was not judged."),
        new("p below", "Probability that the quantity lies below the lower limit."),
        new("p within", "Probability that the quantity lies between the limits."),
        new("p above", "Probability that the quantity lies above the upper limit."),
        new("level", "Probability that an outcome must reach to decide."),
        new("why not judged", "Why there is no verdict."),
        new("marked", "Measured while the instrument was not in order: judged, but never counted silently."),
        new("changes with limits", "Whether the verdict would change if the limits moved within their own intervals."),
        new("lower limit", "Lower reference limit, in the unit beside it."),
        new("upper limit", "Upper reference limit, in the unit beside it."),
        new("lower limit from", "Lower end of the lower limit's own 90 % interval, in the unit beside it."),
        new("lower limit to", "Upper end of the lower limit's own 90 % interval, in the unit beside it."),
        new("upper limit from", "Lower end of the upper limit's own 90 % interval, in the unit beside it."),
        new("upper limit to", "Upper end of the upper limit's own 90 % interval, in the unit beside it."),
        new("method", "How the number was obtained."),

        // Groups.
        new("samples", "How many samples were measured."),
        new("people", "How many people the group has: those counted and those left out."),
        new("n", "How many people are counted; several used samples of one person are averaged and count once."),
        new("people left out", "Why people are left out: codes of their first sample's findings with how many people of each."),
        new("samples used", "How many samples are used; with the marked ones and the ones set aside these are all samples measured."),
        new("set aside", "How many samples are left out, though the instrument was in order."),
        new("reasons", "Why they are left out: codes of findings with how many of each."),
        new("mean", "Geometric mean for viscosities, arithmetic mean for indices, in the unit beside it."),
        new("spread", "Standard deviation among people on the working scale: for viscosities, of the natural logarithm."),
        new("ratio", "Second group over first group."),
        new("ratio lower", "Lower end of the ratio's 95 % interval."),
        new("ratio upper", "Upper end of the ratio's 95 % interval."),
        new("question", "Which question the comparison answers: total, or adjusted for hematocrit."),
        new("first group", "Label of the first group, the controls."),
        new("second group", "Label of the second group."),
        new("below", "How many lie below the lower limit."),
        new("within", "How many lie between the limits."),
        new("above", "How many lie above the upper limit."),
        new("undecided", "How many are undecided."),
        new("not judged", "How many could not be judged."),

        // Runs.
        new("what", "What the row is about."),
        new("name", "Its name."),
        new("before", "Before; empty where it was not there."),
        new("after", "After; empty where it is not there."),
        new("nearest cause", "For a changed result, the nearest input, setting or version that changed."),
        new("count", "How many."),
        new("meaning", "What a cell of the column says."),
        new("table", "File that the column stands in."),
        new("caution", "What the numbers of the row are for."),
        new("marked ones", "How many are judged but marked, because the instrument was not in order; not among the others."),
    ];

    /// <summary>The column of this name.</summary>
    /// <param name="name">Its name, exactly.</param>
    /// <exception cref="ArgumentException">There is no such column; the message names the nearest one.</exception>
    public static Column Column(string name) => All.FirstOrDefault(column => column.Name == name)
        ?? throw new ArgumentException($"No column \"{name}\" in the glossary{Suggestion(name)}. A new column is added in Tables/Glossary.cs, with its meaning and unit.", nameof(name));

    /// <summary>The data dictionary of these columns: name, meaning, unit and UCUM code.</summary>
    /// <param name="columns">The columns, in order.</param>
    public static Table Describe(IEnumerable<Column> columns) => Table.Of("name", "meaning", "unit", "UCUM code")
        .WithRows(columns, column => [column.Header, column.Meaning, column.Unit?.Symbol, column.Unit?.Ucum]);

    private static string Suggestion(string name) => Spelling.Nearest(name, All.Select(column => column.Name)) is { } nearest ? $"; the nearest one is \"{nearest}\"" : "";
}
