using System.Globalization;

namespace HemoRheo;

/// <summary>What a reader of a cohort summary must be told.</summary>
internal static class CohortCautions
{
    private const int SmallGroup = 20;
    private const double Risk = 0.05;

    internal static Items<string> For(IReadOnlyCollection<MeasurandSummary> measurands)
    {
        var cautions = new List<string> { "Research use only: these are research values, not a diagnosis." };
        if (measurands.Any(measurand => measurand.Adjusted is not null))
        {
            cautions.Add("Total and adjusted differences answer different questions: the total one holds whatever comes with a different hematocrit, the adjusted one asks what would be left at equal hematocrit. Neither shows a cause.");
            cautions.Add("The adjustment takes hematocrit's error as a measurement error of the known size, and the slope and the scatter as equal in both groups.");
        }

        var tests = measurands.Sum(measurand => new[] { measurand.Total, measurand.Adjusted }.Count(difference => difference?.Probability is not null));
        if (tests > 1)
        {
            cautions.Add(string.Create(CultureInfo.InvariantCulture, $"Many comparisons: {tests} differences are shown. Where there is none at all, {Risk * tests:0.#} of them are expected to have p below {Risk} by chance."));
        }

        var smallest = measurands.SelectMany(measurand => new[] { measurand.First, measurand.Second }).Where(group => group.Mean is not null).Select(group => group.Used).DefaultIfEmpty(SmallGroup).Min();
        if (smallest < SmallGroup) cautions.Add($"Small groups: the smallest has {smallest} people. Its scatter is poorly known, and one person can move its mean.");
        return cautions.ToItems();
    }
}
