namespace HemoRheo;

/// <content>Single readings and their fields.</content>
public static partial class ExportFindings
{
    /// <summary>A row has more or fewer fields than the header; it was kept out.</summary>
    public static FindingKind FieldCountDiffers { get; } = Fault("field-count-differs", "A row has more or fewer fields than the header; it was kept out.", "a separator inside a field, such as a decimal comma between commas, or a damaged row", "correct separator and decimal_sign in the layout, or export again");

    /// <summary>A field of a reading is empty.</summary>
    public static FindingKind FieldEmpty { get; } = Warning("field-empty", "A field of a reading is empty.", "the instrument gave no value", "look at the reading in the instrument's software");

    /// <summary>A field that should hold a number holds something else; the reading was kept out.</summary>
    public static FindingKind NotANumber { get; } = Fault("not-a-number", "A field that should hold a number holds something else; the reading was kept out.", "a remark or a status word in a column of numbers", "correct the export");

    /// <summary>A number is spelled as not a number or as infinite; the reading was kept out.</summary>
    public static FindingKind NotFinite { get; } = Fault("not-finite", "A number is spelled as not a number or as infinite; the reading was kept out.", "a division by zero in the instrument's software", "look at the reading in the instrument's software");

    /// <summary>A shear rate or speed is zero or negative; the reading was kept for screening to set aside.</summary>
    public static FindingKind RateNotPositive { get; } = Fault("rate-not-positive", "A shear rate or speed is zero or negative; the reading was kept for screening to set aside.", "a reading at rest, or the other sense of rotation", "export only readings of the ramp");

    /// <summary>A shear stress or torque is zero or negative.</summary>
    public static FindingKind StressNotPositive { get; } = Warning("stress-not-positive", "A shear stress or torque is zero or negative.", "a torque below what the instrument resolves, or a wrong torque zero", "check the torque zero");

    /// <summary>The ramp field holds a word that the layout does not know; the reading's ramp is unstated.</summary>
    public static FindingKind RampWordUnknown { get; } = Warning("ramp-word-unknown", "The ramp field holds a word that the layout does not know; the reading's ramp is unstated.", "a new name of an interval", "add the word to up_words or down_words");

    /// <summary>A time has no offset and was refused.</summary>
    public static FindingKind TimeWithoutOffset { get; } = Fault("time-without-offset", "A time has no offset and was refused.", "an export in local time", "export the offset, or give started_at with offset in the table");

    /// <summary>A time does not have the declared format and was refused.</summary>
    public static FindingKind TimeNotRead { get; } = Fault("time-not-read", "A time does not have the declared format and was refused.", "another version of the export", "correct time_format in the layout, or the time");

    private static FindingKind[] Readings => [FieldCountDiffers, FieldEmpty, NotANumber, NotFinite, RateNotPositive, StressNotPositive, RampWordUnknown, TimeWithoutOffset, TimeNotRead];
}
