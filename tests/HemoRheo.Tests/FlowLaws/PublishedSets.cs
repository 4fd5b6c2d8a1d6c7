namespace HemoRheo.Tests.FlowLaws;

/// <summary>The parameter sets of tests/ReferenceData/flow-laws in the library's own parameters.</summary>
internal static class PublishedSets
{
    public static Dictionary<string, double> Written(string text) => text.Split(';', StringSplitOptions.TrimEntries)
        .Select(part => part.Split('='))
        .ToDictionary(part => part[0], part => double.Parse(part[1], System.Globalization.CultureInfo.InvariantCulture));

    /// <summary>The law of a written name. The modified Cross law (1 + (lambda rate)^m)^-a is Carreau and Yasuda's with exponents m and n = 1 - a m.</summary>
    public static FlowLaw Law(string written) => FlowLaw.Named(written switch { "power-law" => "Power law", "modified-cross" => "Carreau-Yasuda", _ => written });

    public static double[] Natural(string law, IReadOnlyDictionary<string, double> p) => law switch
    {
        "modified-cross" => [p["eta_0"], p["eta_inf"], p["lambda"], p["m"], 1 - p["a"] * p["m"]],
        "quemada" => [p["eta_p"] / Math.Pow(AtHigh(p), 2), p["gamma_c"], AtLow(p) / AtHigh(p)],
        _ => [.. p.Values],
    };

    /// <summary>Derivatives of the library's parameters by a written one: for Quemada the chain from k0, kinf, eta_p and H, for the modified Cross law that from a and m.</summary>
    public static double[] Chain(string law, IReadOnlyDictionary<string, double> p, string by)
    {
        if (law == "modified-cross" && by == "m") return [0, 0, 0, 1, -p["a"]];
        if (law == "modified-cross" && by == "a") return [0, 0, 0, 0, -p["m"]];
        if (law == "modified-cross") return [.. ((string[])["eta_0", "eta_inf", "lambda", "m", "n"]).Select(name => name == by ? 1.0 : 0.0)];
        if (law != "quemada") return [.. p.Keys.Select(name => name == by ? 1.0 : 0.0)];
        var (high, low, h, etaP) = (AtHigh(p), AtLow(p), p["H"], p["eta_p"]);
        return by switch
        {
            "eta_p" => [1 / (high * high), 0, 0],
            "gamma_c" => [0, 1, 0],
            "k0" => [0, 0, -h / 2 / high],
            "kinf" => [etaP * h / Math.Pow(high, 3), 0, low * (h / 2) / (high * high)],
            "H" => [etaP * p["kinf"] / Math.Pow(high, 3), 0, (-p["k0"] / 2 * high + low * p["kinf"] / 2) / (high * high)],
            _ => throw new ArgumentException($"No parameter {by}.", nameof(by)),
        };
    }

    private static double AtHigh(IReadOnlyDictionary<string, double> p) => 1 - p["H"] * p["kinf"] / 2;

    private static double AtLow(IReadOnlyDictionary<string, double> p) => 1 - p["H"] * p["k0"] / 2;
}
