namespace HemoRheo.Benchmarks;

/// <summary>How often intervals held the truth, by quantity and by what was left out of the budget; and how often a verdict was wrong with the truth at a limit.</summary>
internal sealed class CoverageCounts
{
    /// <summary>What is left out of the budget in each column.</summary>
    public static readonly IReadOnlyDictionary<string, SourceKind[]> LeftOut = new Dictionary<string, SourceKind[]>
    {
        ["whole budget"] = [],
        ["no loading"] = [SourceKind.Loading],
        ["no calibration"] = [SourceKind.Calibration, SourceKind.Certificate, SourceKind.FluidBeta, SourceKind.Thermometer],
        ["no counter"] = [SourceKind.Counter],
        ["no shared part"] = [SourceKind.Calibration, SourceKind.Certificate, SourceKind.FluidBeta, SourceKind.Thermometer, SourceKind.Day, SourceKind.Counter, SourceKind.BloodBeta],
    };

    private readonly SortedDictionary<(string Quantity, string Budget), (int Held, int Of)> _counts = [];

    /// <summary>Wrong verdicts and all verdicts asked for, with the truth at the limit itself.</summary>
    public (int Wrong, int Of) Verdicts { get; private set; }

    /// <summary>Quantities counted, in order.</summary>
    public IEnumerable<string> Quantities => _counts.Keys.Select(key => key.Quantity).Distinct();

    /// <summary>Share of intervals that held the truth.</summary>
    public double Share(string quantity, string budget) => (double)_counts[(quantity, budget)].Held / _counts[(quantity, budget)].Of;

    /// <summary>How many intervals were counted.</summary>
    public int Of(string quantity) => _counts[(quantity, "whole budget")].Of;

    /// <summary>Counts one analyzed study.</summary>
    public void Add(SimulatedStudy truth, AnalyzedStudy analyzed)
    {
        Value Find(string sample, double rate, bool standard) =>
            analyzed.Samples.First(result => result.Sample == sample).Find("Casson", Measurand.Viscosity(rate.PerSecond()), standard ? HematocritBasis.StandardByPlasma : HematocritBasis.Native)!.Value;

        var (first, last) = (truth.Samples[0], truth.Samples[^1]);
        foreach (var standard in new[] { false, true })
        {
            var basis = standard ? "standard" : "native";
            foreach (var rate in SimulatedStudy.StandardRates)
            {
                foreach (var sample in truth.Samples)
                {
                    var value = Find(sample.Id, rate, standard);
                    Count($"{basis} at {rate}", value, sample.Truth[(rate, standard)]);
                    Judge(value, sample.Truth[(rate, standard)]);
                }

                Count($"two samples, {basis} at {rate}", Find(first.Id, rate, standard) - Find(last.Id, rate, standard), first.Truth[(rate, standard)] - last.Truth[(rate, standard)]);
                Count($"mean of all, {basis} at {rate}", Value.Mean([.. truth.Samples.Select(sample => Find(sample.Id, rate, standard))]), truth.Samples.Average(sample => sample.Truth[(rate, standard)]));
            }

            Count($"ratio 1 to 100, {basis}", Find(first.Id, 1, standard) - Find(first.Id, 100, standard), first.Truth[(1, standard)] - first.Truth[(100, standard)]);
        }
    }

    /// <summary>The table as text.</summary>
    public string ToText()
    {
        var lines = new List<string> { string.Concat(LeftOut.Keys.Select(budget => $"{budget,16}").Prepend($"{"",-32}")) };
        lines.AddRange(Quantities.Select(quantity => string.Concat(LeftOut.Keys.Select(budget => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{100 * Share(quantity, budget),16:F1}")).Prepend($"{quantity,-32}"))));
        lines.Add(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"verdicts with the truth at the limit: {Verdicts.Wrong} of {Verdicts.Of} wrong, {100.0 * Verdicts.Wrong / Verdicts.Of:F2} %"));
        return string.Join('\n', lines);
    }

    private void Count(string quantity, Value value, double truth)
    {
        foreach (var (budget, kinds) in LeftOut)
        {
            var (held, of) = _counts.GetValueOrDefault((quantity, budget));
            _counts[(quantity, budget)] = (held + (value.Only(source => !kinds.Contains(source.Kind)).Interval().Contains(truth) ? 1 : 0), of + 1);
        }
    }

    // The truth lies on the limit: taken as just inside, "below" and "above" are wrong; taken as just outside, "within" is.
    private void Judge(Value value, double truth)
    {
        var lower = Verdict.Of(value, new(truth, truth + 10)).Outcome;
        var upper = Verdict.Of(value, new(truth - 10, truth)).Outcome;
        var wrong = new[] { lower == Outcome.Below, upper == Outcome.Above, lower == Outcome.Within, upper == Outcome.Within }.Count(wrongly => wrongly);
        Verdicts = (Verdicts.Wrong + wrong, Verdicts.Of + 4);
    }
}
