namespace HemoRheo.Notebooks;

/// <summary>A flow curve, point by point: kept points, then those set aside with the reasons.</summary>
internal static class CurveView
{
    public static Table Table(FlowCurve curve) => HemoRheo.Table.Of("point", "shear rate", "shear stress", "viscosity", "temperature", "kept", "set aside because", "where")
        .WithRows(curve.Points, point => Row(point, []))
        .WithRows(curve.SetAside, aside => Row(aside.Point, aside.Findings));

    public static Markup Of(FlowCurve curve) => Markup.Of($"{TableMarkup.Of(Table(curve), curve.ToString())}{FindingsView.Folded(curve.Findings.With(curve.SetAside.SelectMany(aside => aside.Findings)))}");

    private static Cell[] Row(FlowPoint point, Items<Finding> findings) =>
    [
        point.Number,
        point.Rate.ReciprocalSeconds,
        point.Stress.Millipascals,
        point.Rate.ReciprocalSeconds == 0 ? Cell.Empty : point.ApparentViscosity.MillipascalSeconds,
        point.Reading?.Temperature,
        findings.Count == 0,
        string.Join(", ", findings.Select(finding => finding.Code)),
        point.Reading?.Where.ToString(),
    ];
}
