namespace HemoRheo.Notebooks;

/// <summary>Why a value may not be decided on.</summary>
internal static class WhyNot
{
    /// <summary>Codes of the findings that say so: the weightier ones, or all where there are none.</summary>
    public static IEnumerable<string> Codes(SampleValue value)
    {
        var weighty = value.Findings.Where(finding => finding.Severity != Severity.Note).ToArray();
        return (weighty.Length > 0 ? weighty : value.Findings.ToArray()).Select(finding => finding.Code).Distinct();
    }
}
