namespace HemoRheo;

/// <summary>The screening rules. A new rule is one file in the folder Rules and one line here.</summary>
public static class ScreeningRules
{
    /// <summary>Rules that judge each reading for itself or the curve as a whole; all of them see the same curve.</summary>
    public static Items<IScreeningRule> OnReadings { get; } =
    [
        new NotAboveZero(),
        new TorqueBelowFloor(),
        new TemperatureOff(),
        new SpeedNotReached(),
        new TooLongSinceDraw(),
        new OutOfTimeOrder(),
    ];

    /// <summary>Rules that judge the readings left by the others, so that a reading repeated for good reason takes the place of the one set aside.</summary>
    public static Items<IScreeningRule> OnWhatIsLeft { get; } = [new DuplicateReading(), new ImplausibleViscosity()];

    /// <summary>Every rule.</summary>
    public static Items<IScreeningRule> All { get; } = OnReadings.With(OnWhatIsLeft);
}
