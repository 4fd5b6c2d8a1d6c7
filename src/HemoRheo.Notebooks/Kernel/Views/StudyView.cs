using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>A study: what its file asks for.</summary>
internal static class StudyView
{
    public static Markup Of(Study study) => TableMarkup.Of(
        Table.Of("what", "name").WithRows(Rows(study), row => [row.Name, row.Text]),
        $"Study {study.Name}, as its study file says");

    private static NamedText[] Rows(Study study) =>
    [
        new("layouts of exports", string.Join(", ", study.Layouts.Select(layout => layout.Name))),
        new("instruments", string.Join(", ", study.Instruments.Select(instrument => instrument.Name))),
        new("calibration fluids", string.Join(", ", study.Fluids.Select(fluid => $"{fluid.Name} (lot {fluid.Lot})"))),
        new("laws", $"{string.Join(", ", study.Analysis.Laws)}; decided by {study.Analysis.DecideBy}"),
        new("standard shear rates", string.Join(", ", study.Analysis.StandardRates)),
        new("ramp analyzed", Words.Of(study.Analysis.Ramp)),
        new("standard hematocrit", $"{study.Standard.Hematocrit}, decided by {Words.Of(study.Standard.DecideBy.Basis())}"),
        new("level of a verdict", string.Create(CultureInfo.InvariantCulture, $"{study.Analysis.Level:P0}")),
        new("groups", string.Join(", ", study.Groups.Select(group => group.Label))),
        new("reference ranges from", string.Join(", ", study.Groups.Where(group => group.Controls).Select(group => group.Label))),
    ];
}
