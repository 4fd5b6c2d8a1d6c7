using System.Globalization;

namespace HemoRheo;

/// <summary>One cell of a table: a number, a text, or nothing.</summary>
/// <remarks>Texts, numbers, counts and moments turn into cells by themselves; a number that is shown rounded is made with <see cref="Rounded(double, double)"/>.</remarks>
public readonly record struct Cell
{
    private readonly string? _shown;

    private Cell(double? number, string? shown)
    {
        Number = number;
        _shown = shown;
    }

    /// <summary>A cell that says nothing.</summary>
    public static Cell Empty => default;

    /// <summary>Its number, unrounded; null for text.</summary>
    public double? Number { get; }

    /// <summary>What a reader sees.</summary>
    public string Shown => _shown ?? "";

    /// <summary>Whether it says nothing.</summary>
    public bool IsEmpty => Shown.Length == 0;

    /// <summary>A number that is shown rounded and written in full to files.</summary>
    /// <param name="number">The number, in the unit of its column.</param>
    /// <param name="shown">The number as a reader sees it.</param>
    /// <exception cref="ArgumentException">The number is not a number.</exception>
    public static Cell Rounded(double number, string shown) => new(Checked(number), shown);

    /// <summary>A number with its uncertainty: shown to the place of the uncertainty's second digit.</summary>
    /// <param name="number">The number, in the unit of its column.</param>
    /// <param name="uncertainty">Its standard uncertainty, in the same unit.</param>
    /// <exception cref="ArgumentException">The number is not a number.</exception>
    public static Cell Rounded(double number, double uncertainty) => new(Checked(number), Rounding.Number(number, uncertainty));

    /// <summary>A text, or nothing for null.</summary>
    public static implicit operator Cell(string? text) => new(null, text);

    /// <summary>A number, shown to five significant digits.</summary>
    public static implicit operator Cell(double number) => new(Checked(number), Rounding.Digits(number, 5));

    /// <summary>A number, or nothing for null.</summary>
    public static implicit operator Cell(double? number) => number is { } known ? known : Empty;

    /// <summary>A count, shown in full.</summary>
    public static implicit operator Cell(int count) => new(count, count.ToString(CultureInfo.InvariantCulture));

    /// <summary>A count, or nothing for null.</summary>
    public static implicit operator Cell(int? count) => count is { } known ? known : Empty;

    /// <summary>Yes or no.</summary>
    public static implicit operator Cell(bool answer) => new(null, answer ? "yes" : "no");

    /// <summary>A moment, as ISO 8601 with its offset.</summary>
    public static implicit operator Cell(DateTimeOffset moment) => new(null, moment.ToString("yyyy-MM-dd'T'HH:mm:sszzz", CultureInfo.InvariantCulture));

    /// <summary>A moment, or nothing for null.</summary>
    public static implicit operator Cell(DateTimeOffset? moment) => moment is { } known ? known : Empty;

    /// <summary>A date, as ISO 8601.</summary>
    public static implicit operator Cell(DateOnly date) => new(null, date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));

    /// <inheritdoc/>
    public override string ToString() => Shown;

    private static double Checked(double number) => double.IsNaN(number)
        ? throw new ArgumentException("A cell holds a number or nothing, never a NaN: leave it empty and say why in a column of its own.", nameof(number))
        : number;
}
