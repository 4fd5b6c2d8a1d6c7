namespace HemoRheo;

/// <summary>What the value of a key of the study file is.</summary>
public enum StudyFileKeyKind
{
    /// <summary>A text.</summary>
    Text,

    /// <summary>A list of texts.</summary>
    Texts,

    /// <summary>One of the words that the key allows.</summary>
    Word,

    /// <summary>A list of words that the key allows.</summary>
    Words,

    /// <summary>A whole number.</summary>
    WholeNumber,

    /// <summary>A plain number.</summary>
    Number,

    /// <summary>True or false.</summary>
    Truth,

    /// <summary>A number and its unit as text, such as "12.5 mm".</summary>
    Quantity,

    /// <summary>A list of numbers with their units.</summary>
    Quantities,

    /// <summary>A list of dates and times with offset, as TOML writes them.</summary>
    Moments,

    /// <summary>A date, as TOML writes it.</summary>
    Date,

    /// <summary>A table { header, unit } that says what an export calls a field.</summary>
    Field,
}
