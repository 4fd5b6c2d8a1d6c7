namespace HemoRheo;

/// <content>Single readings and their fields.</content>
public static partial class ExportFindings
{
    /// <summary>A row has more or fewer fields than the header; it was kept out.</summary>
    public static FindingKind FieldCountDiffers { get; } = new("field-count-differs", Severity.Fault, "A row has more or fewer fields than the header; it was kept out.", "A separator inside a field, such as a decimal comma between commas, or a damaged row.", "Correct separator and decimal_sign in the layout, or export again.");

    /// <summary>A field of a reading is empty.</summary>
    public static FindingKind FieldEmpty { get; } = new("field-empty", Severity.Warning, "A field of a reading is empty.", "The instrument gave no value.", "Look at the reading in the instrument's software.");

    /// <summary>A field that should hold a number holds something else; the reading was kept out.</summary>
    public static FindingKind NotANumber { get; } = new("not-a-number", Severity.Fault, "A field that should hold a number holds something else; the reading was kept out.", "A remark or a status word in a column of numbers.", "Correct the export.");

    /// <summary>A number is spelled as not a number or as infinite; the reading was kept out.</summary>
    public static FindingKind NotFinite { get; } = new("not-finite", Severity.Fault, "A number is spelled as not a number or as infinite; the reading was kept out.", "A division by zero in the instrument's software.", "Look at the reading in the instrument's software.");

    /// <summary>A shear rate or speed is zero or negative; the reading was kept for screening to set aside.</summary>
    public static FindingKind RateNotPositive { get; } = new("rate-not-positive", Severity.Warning, "A shear rate or speed is zero or negative; the reading was kept for screening to set aside.", "A reading at rest, or the other sense of rotation.", "Export only readings of the ramp.");

    /// <summary>A shear stress or torque is zero or negative.</summary>
    public static FindingKind StressNotPositive { get; } = new("stress-not-positive", Severity.Warning, "A shear stress or torque is zero or negative.", "A torque below what the instrument resolves, or a wrong torque zero.", "Check the torque zero.");

    /// <summary>The ramp field holds a word that the layout does not know; the reading's ramp is unstated.</summary>
    public static FindingKind RampWordUnknown { get; } = new("ramp-word-unknown", Severity.Warning, "The ramp field holds a word that the layout does not know; the reading's ramp is unstated.", "A new name of an interval.", "Add the word to up_words or down_words.");

    /// <summary>A time has no offset and was refused.</summary>
    public static FindingKind TimeWithoutOffset { get; } = new("time-without-offset", Severity.Fault, "A time has no offset and was refused.", "An export in local time.", "Export the offset, or give started_at with offset in the table.");

    /// <summary>A time does not have the declared format and was refused.</summary>
    public static FindingKind TimeNotRead { get; } = new("time-not-read", Severity.Fault, "A time does not have the declared format and was refused.", "Another version of the export.", "Correct time_format in the layout, or the time.");

    private static FindingKind[] Readings => [FieldCountDiffers, FieldEmpty, NotANumber, NotFinite, RateNotPositive, StressNotPositive, RampWordUnknown, TimeWithoutOffset, TimeNotRead];
}
