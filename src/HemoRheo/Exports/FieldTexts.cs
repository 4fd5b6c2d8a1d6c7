namespace HemoRheo;

/// <summary>The texts of one row or block by what they mean, with the column of each (its number in a row; 1 for a key line).</summary>
internal sealed class FieldTexts
{
    private static readonly int Size = Enum.GetValues<FieldMeaning>().Length;
    private readonly string?[] _texts = new string?[Size];
    private readonly int[] _columns = new int[Size];
    private readonly int[] _lines = new int[Size];

    public string? this[FieldMeaning meaning] => _texts[(int)meaning];

    public int Column(FieldMeaning meaning) => _columns[(int)meaning];

    public int Line(FieldMeaning meaning) => _lines[(int)meaning];

    public void Put(FieldMeaning meaning, string text, int line, int column) =>
        (_texts[(int)meaning], _lines[(int)meaning], _columns[(int)meaning]) = (text, line, column);
}
