using static System.FormattableString;

namespace HemoRheo;

/// <summary>Curves fitted together, said as a sentence: <c>curves.FitLoadings(FlowLaw.Quemada, errors)</c>. The work grows with the cube of the unknowns: hundreds of curves take seconds.</summary>
public static class JointFits
{
    /// <summary>Fits loadings of one sample together: the law's parameters shared, and a factor of its own for every loading.</summary>
    /// <param name="curves">One curve a loading, at least two.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">The error model of all.</param>
    /// <returns>The fit. Curves whose numbers cannot be fitted are left out with a finding; fewer than two left give an unusable fit.</returns>
    /// <exception cref="ArgumentException">There are fewer than two curves.</exception>
    public static LoadingsFit FitLoadings(this IReadOnlyList<FlowCurve> curves, FlowLaw law, ErrorModel errors) => curves.FitLoadings(law, ForAll(curves, errors));

    /// <summary>The same with an error model for every loading.</summary>
    /// <param name="curves">One curve a loading, at least two.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">One error model a curve.</param>
    /// <exception cref="ArgumentException">There are fewer than two curves, not as many error models, or some sizes are known and others are not.</exception>
    public static LoadingsFit FitLoadings(this IReadOnlyList<FlowCurve> curves, FlowLaw law, IReadOnlyList<ErrorModel> errors)
    {
        ArgumentNullException.ThrowIfNull(law);
        Check(curves, errors);
        return LoadingsFit.Of(JointReport.Of(new()
        {
            Curves = curves,
            Laws = [.. curves.Select(_ => law)],
            Errors = errors,
            Shared = [.. law.Parameters.Select(parameter => parameter.Name)],
            WithFactors = true,
        }));
    }

    /// <summary>Fits one law to several curves, say of one blood at several hematocrits, some of its parameters shared: <c>curves.FitTogether(FlowLaw.Quemada, share: ["critical rate"], errors)</c>.</summary>
    /// <param name="curves">At least two curves.</param>
    /// <param name="law">The law, a user's own included.</param>
    /// <param name="share">Names of the parameters that the curves share; all make one curve of all points, none the same estimates as separate fits.</param>
    /// <param name="errors">The error model of all.</param>
    /// <returns>The fit. Curves whose numbers cannot be fitted, or with fewer different rates than parameters of their own, are left out with a finding; fewer than two left give an unusable fit.</returns>
    /// <exception cref="ArgumentException">There are fewer than two curves, or the law has no parameter of a name; the message lists those it has.</exception>
    public static JointFit FitTogether(this IReadOnlyList<FlowCurve> curves, FlowLaw law, IReadOnlyList<string> share, ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(law);
        var all = ForAll(curves, errors);
        return curves.FitTogether([.. curves.Select(_ => law)], share, all);
    }

    /// <summary>The same with a law and an error model for every curve: laws of the same parameters that know something of their curve, say its hematocrit.</summary>
    /// <param name="curves">At least two curves.</param>
    /// <param name="laws">One law a curve; their parameters have the same names and bounds.</param>
    /// <param name="share">Names of the parameters that the curves share.</param>
    /// <param name="errors">One error model a curve.</param>
    /// <exception cref="ArgumentException">There are fewer than two curves, or not as many laws or error models; the laws' parameters differ; a name is not among them; some sizes of errors are known and others are not.</exception>
    public static JointFit FitTogether(this IReadOnlyList<FlowCurve> curves, IReadOnlyList<FlowLaw> laws, IReadOnlyList<string> share, IReadOnlyList<ErrorModel> errors)
    {
        ArgumentNullException.ThrowIfNull(laws);
        ArgumentNullException.ThrowIfNull(share);
        Check(curves, errors);
        if (laws.Count != curves.Count) throw new ArgumentException($"There are {curves.Count} curves and {laws.Count} laws; each curve needs one.", nameof(laws));
        foreach (var law in laws)
        {
            if (!law.Parameters.Select(Range).SequenceEqual(laws[0].Parameters.Select(Range))) throw new ArgumentException($"The parameters of {law.Name} are not those of {laws[0].Name}: laws fitted together have parameters of the same names and bounds.", nameof(laws));
        }

        string[] names = [.. laws[0].Parameters.Select(parameter => parameter.Name)];
        if (share.FirstOrDefault(name => !names.Contains(name)) is { } unknown) throw new ArgumentException($"{laws[0].Name} has no parameter '{unknown}' to share; its parameters are {string.Join(", ", names)}.", nameof(share));
        return JointReport.Of(new() { Curves = curves, Laws = laws, Errors = errors, Shared = [.. share.Distinct()] });

        static object Range(LawParameter parameter) => parameter with { Start = null };
    }

    /// <summary>
    /// Fits a dilution series of one blood by Quemada's law with hematocrit as second predictor: the structure parameters at rest and at high shear, the critical rate and the plasma viscosity are shared.
    /// stress = rate x plasma viscosity x (1 - k H/2)^-2, k = (k0 + kinf s)/(1 + s), s = sqrt(rate / critical rate).
    /// </summary>
    /// <param name="curves">One curve a hematocrit, at least two.</param>
    /// <param name="hematocrits">Their hematocrits, between 0 and 1 L/L, taken as exact.</param>
    /// <param name="errors">The error model of all.</param>
    /// <returns>The fit; its <see cref="JointFit.Compatibility"/> holds it against Quemada's law with three numbers for every curve.</returns>
    /// <remarks>The structure parameters are kept between 0 and 2 / highest hematocrit. Series of hematocrits that lie close together cannot tell plasma viscosity from structure, and say so. No loading has a factor here: where loadings scatter by more than the readings' errors, the fit and its <see cref="JointFit.Compatibility"/> feel it. Source: Quemada 1978, Rheologica Acta 17:632-642.</remarks>
    /// <exception cref="ArgumentException">There are fewer than two curves, not as many hematocrits, or one outside 0 to 1 L/L.</exception>
    public static JointFit FitDilution(this IReadOnlyList<FlowCurve> curves, IReadOnlyList<Hematocrit> hematocrits, ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(hematocrits);
        var all = ForAll(curves, errors);
        Check(curves, all);
        if (hematocrits.Count != curves.Count) throw new ArgumentException($"There are {curves.Count} curves and {hematocrits.Count} hematocrits; each curve needs one.", nameof(hematocrits));
        foreach (var one in hematocrits)
        {
            if (!(one.LiterPerLiter > 0 && one.LiterPerLiter < 1)) throw new ArgumentException(Invariant($"A hematocrit lies between 0 and 1 L/L; this one is {one.LiterPerLiter}."), nameof(hematocrits));
        }

        var laws = DilutionLaw.Laws(hematocrits, Fits.OfAll(curves, FlowLaw.Quemada, all[0]));
        return JointReport.Of(new()
        {
            Curves = curves,
            Laws = laws,
            Errors = all,
            Shared = [.. laws[0].Parameters.Select(parameter => parameter.Name)],
            Alone = FlowLaw.Quemada,
            Walls = new Dictionary<string, JointWall> { [DilutionLaw.AtRest] = DilutionLaw.Wall(laws[0]) },
        });
    }

    private static ErrorModel[] ForAll(IReadOnlyList<FlowCurve> curves, ErrorModel? errors)
    {
        ArgumentNullException.ThrowIfNull(curves);
        return [.. curves.Select(_ => errors ?? ErrorModel.Default)];
    }

    private static void Check(IReadOnlyList<FlowCurve> curves, IReadOnlyList<ErrorModel> errors)
    {
        ArgumentNullException.ThrowIfNull(curves);
        ArgumentNullException.ThrowIfNull(errors);
        foreach (var curve in curves) ArgumentNullException.ThrowIfNull(curve);
        if (curves.Count < 2) throw new ArgumentException($"A joint fit needs at least two curves; there {(curves.Count == 1 ? "is 1. One curve alone is fitted by curve.Fit(law)" : "are none")}.", nameof(curves));
        if (errors.Count != curves.Count) throw new ArgumentException($"There are {curves.Count} curves and {errors.Count} error models; each curve needs one.", nameof(errors));
        if (errors.Any(one => one.ScaleKnown != errors[0].ScaleKnown)) throw new ArgumentException("Some error models have known sizes and others are known up to scale; curves fitted together need one kind.", nameof(errors));
    }
}
