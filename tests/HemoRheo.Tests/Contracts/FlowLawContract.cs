namespace HemoRheo.Tests.Contracts;

/// <summary>What every built-in flow law must do.</summary>
public class FlowLawContract
{
    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    public static TheoryData<string> Laws => [.. FlowLaw.All.Select(law => law.Name)];

    [Theory]
    [MemberData(nameof(Laws))]
    public void It_names_its_source_its_range_and_its_parameters(string name)
    {
        var law = FlowLaw.Named(name);
        Assert.NotEmpty(law.Source.Author);
        Assert.NotEmpty(law.Source.Text);
        Assert.InRange(law.Source.Year, 1600, 2026);
        Assert.True(law.ValidRates.Lower > 0 && law.ValidRates.Upper > law.ValidRates.Lower);
        Assert.InRange(law.Parameters.Count, 1, LaneDual.Slopes);
        Assert.All(law.Parameters, parameter => Assert.False(string.IsNullOrWhiteSpace(parameter.Name) || string.IsNullOrWhiteSpace(parameter.Symbol) || string.IsNullOrWhiteSpace(parameter.Unit)));
        Assert.Equal(law.Parameters.Count, law.Parameters.Select(parameter => parameter.Name).Distinct().Count());
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void Its_slopes_are_those_of_its_stress(string name)
    {
        var law = FlowLaw.Named(name);
        var scaled = law.ToScaled(Invented(law));
        var slopes = new double[scaled.Length];
        foreach (var rate in Rates)
        {
            law.StressAt(rate, scaled, slopes);
            for (var k = 0; k < scaled.Length; k++)
            {
                var expected = (4 * Difference(law, rate, scaled, k, 5e-4) - Difference(law, rate, scaled, k, 1e-3)) / 3;
                Assert.Equal(expected, slopes[k], 1e-9 * law.Stress(ShearRate.FromReciprocalSeconds(rate), Invented(law)).Pascals);
            }
        }
    }

    /// <summary>Slopes written by hand are those of the formula; a law without them passes trivially. 400 points around the invented numbers, far ones among them.</summary>
    [Theory]
    [MemberData(nameof(Laws))]
    public void Its_slopes_by_hand_are_those_of_its_formula(string name)
    {
        var law = FlowLaw.Named(name);
        var (stream, size) = (RandomStream.Of(20261201, "by hand", 1), law.Parameters.Count);
        var (at, exact, byHand) = (new Lane[size], new Lane[size], new Lane[size]);
        var (stress, stressByHand) = (new Lane[1], new Lane[1]);
        for (var i = 0; i < 400; i++)
        {
            double[] scaled = [.. law.ToScaled(Invented(law)).Select(x => x + (i % 4 + 1) * stream.Normal())];
            for (var k = 0; k < size; k++) at[k] = new(scaled[k]);
            Lane[] rate = [new(Math.Exp(6 * stream.Normal()))];
            law.ByFormula(rate, at, stress, exact);
            law.StressesAndSlopes(rate, at, stressByHand, byHand);
            Assert.Equal(stress[0][0], stressByHand[0][0]);
            for (var k = 0; k < size; k++) Assert.Equal(exact[k][0], byHand[k][0], 1e-13 * Math.Abs(stress[0][0]));
        }
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void Its_stress_has_the_same_bits_by_either_road(string name)
    {
        var law = FlowLaw.Named(name);
        var scaled = law.ToScaled(Invented(law));
        foreach (var rate in Rates)
        {
            Assert.Equal(law.Stress(ShearRate.FromReciprocalSeconds(rate), law.ToNatural(scaled)).Pascals, law.StressAt(rate, scaled, new double[scaled.Length]));
        }
    }

    /// <summary>A fluid at rest: the yield stress where there is one, else nothing; never "not a number" from the logarithm of zero.</summary>
    [Theory]
    [MemberData(nameof(Laws))]
    public void At_a_rate_of_zero_its_stress_is_the_yield_stress_and_its_slopes_are_numbers(string name)
    {
        var law = FlowLaw.Named(name);
        var yieldStress = law.Parameters[0].Name == "yield stress" ? Invented(law)[0] : 0;
        var slopes = new double[law.Parameters.Count];
        Assert.Equal(yieldStress, law.Stress(0.PerSecond(), Invented(law)).Pascals, 1e-15);
        Assert.Equal(yieldStress, law.StressAt(0, law.ToScaled(Invented(law)), slopes), 1e-15);
        Assert.Equal(yieldStress, slopes.Sum(), 1e-15);
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void Its_stress_rises_with_rate_and_is_above_zero(string name)
    {
        var law = FlowLaw.Named(name);
        var stresses = Rates.Select(rate => law.Stress(ShearRate.FromReciprocalSeconds(rate), Invented(law)).Pascals).ToArray();
        Assert.True(stresses[^1] > 0);
        Assert.Equal(stresses, stresses.OrderDescending());
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void Its_first_guess_lies_inside_its_bounds_for_any_sound_curve(string name)
    {
        var law = FlowLaw.Named(name);
        double[][] curves =
        [
            Stresses(FlowLaw.Newtonian, 0.0012), Stresses(FlowLaw.Casson, 0.005, 0.0035), Stresses(FlowLaw.Quemada, 0.003, 2, 0.2), Stresses(FlowLaw.Casson, 1e-9, 0.001),
            [.. Rates.Select(rate => 0.01 * Math.Pow(rate, 1.4))], [.. Rates.Select(rate => 0.5 / rate)], [.. Rates.Select(_ => 0.02)], [.. Rates.Select((_, i) => i % 2 == 0 ? 1e-6 : 10.0)],
        ];
        var guess = new double[law.Parameters.Count];
        foreach (var stresses in curves)
        {
            law.FirstGuess(Rates, stresses, guess);
            for (var k = 0; k < guess.Length; k++) Assert.True(guess[k] > law.Parameters[k].Lower && guess[k] < law.Parameters[k].Upper, $"{law.Parameters[k].Name} {guess[k]:R}");
        }
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void It_recovers_its_own_data(string name)
    {
        var law = FlowLaw.Named(name);
        var truth = Invented(law);
        var fit = FlowCurve.Of(Rates, Stresses(law, truth)).Fit(law, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003)));
        Assert.True(fit.Usable, fit.ToString());
        for (var k = 0; k < truth.Length; k++) Assert.Equal(truth[k], fit.Parameters[k].Estimate, 1e-9 * truth[k]);
        Assert.Empty(fit.Findings);
    }

    /// <summary>Believable numbers for blood, invented here; a new law adds its own line.</summary>
    private static double[] Invented(FlowLaw law) => law.Name switch
    {
        "Newtonian" => [0.0035],
        "Power law" => [0.014, 0.78],
        "Bingham" => [0.02, 0.0036],
        "Casson" => [0.005, 0.0034],
        "Herschel-Bulkley" => [0.008, 0.009, 0.86],
        "Quemada" => [0.0031, 2.5, 0.2],
        "Carreau" => [0.05, 0.0036, 2.9, 0.4],
        "Cross" => [0.05, 0.0036, 1.1, 0.95],
        "Carreau-Yasuda" => [0.05, 0.0036, 2.1, 1.3, 0.25],
        _ => throw new ArgumentException($"Write believable numbers for {law.Name} here.", nameof(law)),
    };

    private static double[] Stresses(FlowLaw law, params double[] natural) => [.. Rates.Select(rate => law.Stress(ShearRate.FromReciprocalSeconds(rate), natural).Pascals)];

    private static double Difference(FlowLaw law, double rate, double[] scaled, int k, double h)
    {
        double[] up = [.. scaled], down = [.. scaled];
        up[k] += h;
        down[k] -= h;
        var at = ShearRate.FromReciprocalSeconds(rate);
        return (law.Stress(at, law.ToNatural(up)).Pascals - law.Stress(at, law.ToNatural(down)).Pascals) / (2 * h);
    }
}
