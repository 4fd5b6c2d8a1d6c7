namespace HemoRheo;

/// <summary>What torques rest on, as reports print it.</summary>
public static class TorqueBasisWords
{
    /// <summary>The basis in plain words.</summary>
    public static string Words(this TorqueBasis basis) => basis switch
    {
        TorqueBasis.BlankOfDay => "blank run of the day",
        TorqueBasis.EarlierBlank => "last blank run",
        TorqueBasis.Declared => "declared floor",
        TorqueBasis.None => "nothing",
        _ => throw new ArgumentOutOfRangeException(nameof(basis)),
    };
}
