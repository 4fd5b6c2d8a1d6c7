using System.Globalization;

namespace HemoRheo;

/// <summary>Tries a user's law once, where its parameters start, so that a mistake in it is told in words and not by a strange fit.</summary>
internal static class LawProbe
{
    private static ReadOnlySpan<double> Rates => [1, 10, 100];

    public static FlowLaw<NamedValues> Checked(string name, Func<Items<LawParameter>, UserLaw> make, LawParameter[] parameters)
    {
        ArgumentException.ThrowIfNullOrWhiteSpace(name);
        ArgumentNullException.ThrowIfNull(parameters);
        CheckParameters(name, parameters);
        var law = make(parameters.ToItems());
        double[] starts = [.. parameters.Select(parameter => parameter.Start!.Value)];
        var scaled = law.ToScaled(starts);
        var (slopes, seen) = (new double[scaled.Length], new bool[scaled.Length]);
        foreach (var rate in Rates)
        {
            var stress = Tried(law, rate, scaled, slopes);
            if (!double.IsFinite(stress) || !slopes.All(double.IsFinite)) throw Wrong(law, $"gives a stress of {stress} Pa, with slopes {string.Join(", ", slopes)}, at {rate} 1/s where its parameters start; all must be finite. Look at the starts and at roots, logarithms and quotients");
            for (var k = 0; k < seen.Length; k++) seen[k] |= slopes[k] != 0;
        }

        var ignored = Array.IndexOf(seen, false);
        return ignored < 0 ? law : throw Wrong(law, $"ignores its parameter '{parameters[ignored].Name}', p[{ignored}]: the stress does not change with it. Remove the parameter, or use it");
    }

    private static double Tried(UserLaw law, double rate, double[] scaled, double[] slopes)
    {
        try
        {
            return law.StressAt(rate, scaled, slopes);
        }
        catch (IndexOutOfRangeException)
        {
            throw Wrong(law, $"reads more parameters than the {law.Parameters.Count} that were given ({string.Join(", ", law.Parameters.Select(parameter => parameter.Name))}). Give a LawParameter for each p[...]");
        }
        catch (Exception thrown)
        {
            throw new ArgumentException($"The formula of '{law.Name}' throws at {rate.ToString(CultureInfo.InvariantCulture)} 1/s: {thrown.Message}", thrown);
        }
    }

    private static void CheckParameters(string name, LawParameter[] parameters)
    {
        if (parameters.Length is 0 or > LaneDual.Slopes) throw new ArgumentException($"'{name}' has {parameters.Length} parameters; a flow law has one to five.", nameof(parameters));
        if (parameters.Select(parameter => parameter.Name).Distinct().Count() < parameters.Length) throw new ArgumentException($"Two parameters of '{name}' have the same name.", nameof(parameters));
        if (FlowLaw.All.Any(law => law.Name.Equals(name, StringComparison.OrdinalIgnoreCase))) throw new ArgumentException($"'{name}' is the name of a built-in law; give yours a name of its own.", nameof(name));
        foreach (var parameter in parameters)
        {
            if (double.IsNegativeInfinity(parameter.Lower) && double.IsFinite(parameter.Upper)) throw new ArgumentException($"Parameter '{parameter.Name}' of '{name}' has an upper bound and no lower one; give both, or fit its negative with a lower bound.", nameof(parameters));
            if (parameter.Start is not { } start) throw new ArgumentException($"Parameter '{parameter.Name}' of '{name}' has no start; write Start: and a believable number in {parameter.Unit}.", nameof(parameters));
            if (!(start > parameter.Lower && start < parameter.Upper)) throw new ArgumentException(string.Create(CultureInfo.InvariantCulture, $"Parameter '{parameter.Name}' of '{name}' starts at {start}, which is not between its bounds {parameter.Lower} and {parameter.Upper}."), nameof(parameters));
        }
    }

    private static ArgumentException Wrong(UserLaw law, FormattableString words) => new($"The formula of '{law.Name}' {words.ToString(CultureInfo.InvariantCulture)}.");
}
