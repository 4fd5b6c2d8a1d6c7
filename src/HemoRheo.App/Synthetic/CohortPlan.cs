using System.Globalization;

namespace HemoRheo.App.Synthetic;

/// <summary>The fixed plan of the cohort: who is measured when, on which export, with which planted fault. Nothing here depends on the seed, except the time since the draw.</summary>
internal static class CohortPlan
{
    public const int Weeks = 5;
    public const int People = 80;
    public const int FailedWeek = 4;
    public const string Controls = "lowland";
    public const string SecondGroup = "altitude";
    public const string Instrument = "rheometer-1";
    public const string Geometry = "cup-A";
    public const string Fluid = "oil-5";
    public const string Capillary = "capillary-1";
    public const string Counter = "counter-1";

    private const int PeopleAWeek = People / Weeks;
    private const int PeopleADay = 4;
    private const int SecondVisits = 4;

    /// <summary>When the instrument changes: after the passed check of week 3, before the failed one of week 4.</summary>
    public static DateTimeOffset ChangedAt { get; } = At(Monday(3).AddDays(1), 12, 30);

    /// <summary>When it is put right: after the last sample of week 4.</summary>
    public static DateTimeOffset AdjustedAt { get; } = At(Monday(FailedWeek).AddDays(4), 15, 0);

    /// <summary>When the check of a week starts.</summary>
    public static DateTimeOffset CheckAt(int week) => At(Monday(week), 8, 10);

    /// <summary>All samples, in order of measurement.</summary>
    public static IReadOnlyList<PlannedSample> Samples(long seed)
    {
        var samples = new List<PlannedSample>();
        for (var i = 0; i < People; i++) samples.Add(Visit(seed, i, i, 1, Monday(i / PeopleAWeek + 1).AddDays(i % PeopleAWeek / PeopleADay), i % PeopleADay));
        var again = Enumerable.Range(0, PeopleAWeek).Where(i => !IsSecond(i)).Take(SecondVisits);
        foreach (var i in again) samples.Add(Visit(seed, samples.Count, i, 2, Monday(Weeks).AddDays(4), samples.Count % PeopleADay));
        return samples;
    }

    private static PlannedSample Visit(long seed, int number, int person, int visit, DateOnly day, int slot)
    {
        var sample = Name("S", number + 1, 4);
        var fault = sample switch
        {
            "S-0010" => PlantedFault.TemperatureExcursion,
            "S-0023" => PlantedFault.TooOld,
            "S-0071" => PlantedFault.FileCut,
            _ => PlantedFault.None,
        };
        var first = At(day, 9, 0).AddMinutes(55 * slot);
        IReadOnlyList<DateTimeOffset> starts = slot % 2 == 0 ? [first, first.AddMinutes(25)] : [first];
        var stream = RandomStream.Of(seed, $"draw of {sample}", 1);
        var age = fault == PlantedFault.TooOld ? 400 : Math.Round(35 + 115 * stream.Uniform());
        return new(
            sample,
            Name("P", person + 1, 3),
            IsSecond(person),
            Man(person),
            visit,
            (day.DayNumber - Monday(1).DayNumber) / 7 + 1,
            starts,
            first.AddMinutes(-age),
            Rows(day),
            number % 3 == 2,
            fault);
    }

    /// <summary>Exports of Mondays, Wednesdays and Fridays are rows, a file a day; those of Tuesdays and Thursdays are blocks, a file a sample.</summary>
    private static bool Rows(DateOnly day) => day.DayOfWeek is DayOfWeek.Monday or DayOfWeek.Wednesday or DayOfWeek.Friday;

    // Of every five people two belong to the second group, so that each week has both.
    private static bool IsSecond(int person) => person % 5 is 2 or 4;

    private static bool Man(int person) => person / 5 % 2 == (person % 5 is 0 or 3 or 4 ? 0 : 1);

    private static DateOnly Monday(int week) => new DateOnly(2025, 3, 10).AddDays(7 * (week - 1));

    // Central European time: summer time begins on 30 March 2025.
    private static DateTimeOffset At(DateOnly day, int hour, int minute) =>
        new(day.ToDateTime(new TimeOnly(hour, minute)), TimeSpan.FromHours(day < new DateOnly(2025, 3, 30) ? 1 : 2));

    private static string Name(string letter, int number, int digits) => letter + "-" + number.ToString("D" + digits, CultureInfo.InvariantCulture);
}
