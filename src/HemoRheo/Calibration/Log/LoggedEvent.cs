namespace HemoRheo;

/// <summary>What an entry of an instrument's log says happened: a check, an adjustment, a blank run, a correction of another entry, or the opening of the log.</summary>
public abstract record LoggedEvent
{
    /// <summary>Kind as the file names it.</summary>
    internal abstract string Kind { get; }

    /// <summary>When it happened; null where it is an entry about the log itself.</summary>
    internal virtual DateTimeOffset? Happened => null;
}
