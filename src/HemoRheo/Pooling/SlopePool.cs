namespace HemoRheo;

/// <summary>The study's slope of a log value against hematocrit.</summary>
internal static class SlopePool
{
    private const double NoVariance = 1e-18;

    /// <summary>The slope within groups, knowing hematocrit's error.</summary>
    /// <param name="law">Name of the law.</param>
    /// <param name="measurand">The measurand.</param>
    /// <param name="visits">One value a sample: person, stratum, hematocrit, its standard uncertainty, log value. A person's visits are averaged.</param>
    public static HematocritSlope Pool(string law, Measurand measurand, IReadOnlyList<(string Person, string Stratum, double Hematocrit, double Uncertainty, double LogValue)> visits)
    {
        var people = visits.GroupBy(visit => visit.Person).Select(person => (
            Point: (Group: person.First().Stratum, X: person.Average(visit => visit.Hematocrit), Y: person.Average(visit => visit.LogValue)),
            ErrorVariance: person.Sum(visit => visit.Uncertainty * visit.Uncertainty) / (person.Count() * person.Count()))).ToArray();
        if (people.Length - people.Select(person => person.Point.Group).Distinct().Count() < 3)
        {
            return new(law, measurand, 0, 0, 0, 0, people.Length, $"only {people.Length} people have both values and stand in groups; a slope needs three more people than groups");
        }

        var groups = people.GroupBy(person => person.Point.Group)
            .Select(group => WithinGroup.Of([.. group.Select(person => person.Point.X)], [.. group.Select(person => person.Point.Y)])).ToArray();
        var aware = ErrorAwareSlope.Of(groups, people.Average(person => person.ErrorVariance));
        var plain = ErrorAwareSlope.Of(groups, 0) is { TrueScatter: > NoVariance } known ? known.Slope : 0;
        return aware.Usable
            ? new(law, measurand, aware.Slope, Math.Sqrt(aware.Variance), aware.DegreesOfFreedom, plain, people.Length, null, new(visits.Min(visit => visit.Hematocrit), visits.Max(visit => visit.Hematocrit)))
            : new(law, measurand, 0, 0, 0, plain, people.Length, ErrorAwareSlope.TooCoarse);
    }
}
