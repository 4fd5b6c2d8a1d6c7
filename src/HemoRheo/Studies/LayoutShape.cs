namespace HemoRheo;

/// <summary>The shape of an export file.</summary>
public enum LayoutShape
{
    /// <summary>A header row, then one row a reading; the columns name sample, loading and ramp.</summary>
    Rows,

    /// <summary>One block a recording: lines of key and value, then a header row and the readings.</summary>
    Blocks,
}
