namespace HemoRheo;

/// <summary>Why a field is no number.</summary>
internal enum NumberFault
{
    None,
    Empty,
    OtherDecimalSign,
    NotFinite,
    NotANumber,
}
