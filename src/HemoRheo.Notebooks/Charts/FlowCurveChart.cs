using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>Apparent viscosity against shear rate of a sample's loadings, both on logarithmic axes: readings kept and set aside, the fitted law, the reported values.</summary>
internal static class FlowCurveChart
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 470;

    /// <summary>The picture of one loading.</summary>
    /// <param name="loading">The loading.</param>
    /// <param name="law">Name of the law whose line is drawn.</param>
    public static string Svg(LoadingResult loading, string law) => Svg([loading], law, [], null);

    /// <summary>The picture of a sample's loadings.</summary>
    /// <param name="loadings">Loadings of one sample.</param>
    /// <param name="law">Name of the law whose line is drawn.</param>
    /// <param name="values">Reported values of viscosity at a rate, drawn with their 95 % interval; those of one hematocrit basis.</param>
    /// <param name="lowestStress">Shear stress of the instrument's torque floor, Pa; null where it is not known.</param>
    public static string Svg(IReadOnlyList<LoadingResult> loadings, string law, IReadOnlyList<SampleValue> values, double? lowestStress) => Still.Svg(Model(loadings, law, values, lowestStress), Height);

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(IReadOnlyList<LoadingResult> loadings, string law, IReadOnlyList<SampleValue> values, double? lowestStress)
    {
        var reported = values.Where(value => value.Measurand is ViscosityAtRate && double.IsFinite(value.Value.X)).ToArray();
        var points = loadings.SelectMany(loading => loading.Curve.Points.Concat(loading.Curve.SetAside.Select(aside => aside.Point))).Where(Drawable).ToArray();
        var rates = points.Select(point => point.Rate.ReciprocalSeconds).DefaultIfEmpty(1).ToArray();
        var heights = points.Select(point => point.ApparentViscosity.MillipascalSeconds).Concat(reported.SelectMany(value => new[] { value.Interval().Lower, value.Interval().Upper })).DefaultIfEmpty(1).ToArray();
        var (left, right) = (rates.Min() / 1.4, rates.Max() * 1.4);

        var model = Still.Model();
        model.Axes.Add(Still.Log(AxisPosition.Bottom, "shear rate, 1/s", left, right));
        model.Axes.Add(Still.Log(AxisPosition.Left, "apparent viscosity, mPa·s", heights.Min() / 1.25, heights.Max() * 1.25));
        model.Legends.Add(Still.Legend());
        if (lowestStress is { } floor and > 0) model.Series.Add(Still.Line(new(left, 1000 * floor / left), new(right, 1000 * floor / right), Ink.Muted, LineStyle.LongDash, 1.3, "torque floor"));
        for (var i = 0; i < loadings.Count; i++) Add(model, loadings[i], law, i);
        if (reported.Length > 0) AddReported(model, reported);
        return model;
    }

    private static void Add(PlotModel model, LoadingResult loading, string law, int index)
    {
        var number = loading.Recording.Loading;
        var color = Ink.Member(index);
        var fit = loading.Fits.FirstOrDefault(fit => fit.Law.Name == law);
        if (fit is { Convergence.Converged: true })
        {
            var line = new LineSeries { Color = color, LineStyle = Ink.Line(index), StrokeThickness = 1.6, Title = $"{law}, loading {number}" };
            var points = LawLine.Of(fit).ToArray();
            line.Points.AddRange(points.Select(point => new DataPoint(point.Rate, point.Viscosity)));
            model.Series.Add(Band(points, color));
            model.Series.Add(line);
        }

        var kept = loading.Curve.Points.Where(Drawable).Select(point => Place(point, [])).ToArray();
        if (kept.Length > 0) model.Series.Add(Still.Points(kept, color, Ink.Marker(index), 4.5, title: $"loading {number}, kept"));
        var aside = loading.Curve.SetAside.Where(one => Drawable(one.Point)).Select(one => Place(one.Point, one.Findings)).ToArray();
        if (aside.Length > 0) model.Series.Add(Still.Points(aside, color, index == 0 ? MarkerType.Cross : MarkerType.Plus, 5, title: $"loading {number}, set aside"));
    }

    private static AreaSeries Band(LawPoint[] points, OxyColor color)
    {
        var band = new AreaSeries { Color = OxyColors.Transparent, Color2 = OxyColors.Transparent, Fill = OxyColor.FromAColor(45, color), StrokeThickness = 0, RenderInLegend = false };
        foreach (var point in points)
        {
            if (point.Band is not { } ends) continue;
            band.Points.Add(new(point.Rate, ends.Lower));
            band.Points2.Add(new(point.Rate, ends.Upper));
        }

        return band;
    }

    private static void AddReported(PlotModel model, SampleValue[] values)
    {
        static double Rate(SampleValue value) => ((ViscosityAtRate)value.Measurand).Rate.ReciprocalSeconds;
        model.Series.Add(Still.Strokes(values.Select(value => (new DataPoint(Rate(value), value.Interval().Lower), new DataPoint(Rate(value), value.Interval().Upper))), Ink.Text, 2));
        model.Series.Add(Still.Points(values.Select(value => new ScatterPoint(Rate(value), value.Shown, tag: value.ToString())), Ink.Text, MarkerType.Diamond, 6, hollow: true, title: $"reported, {Words.Short(values[0].Basis)}, 95 %"));
    }

    private static bool Drawable(FlowPoint point) => point.Rate.ReciprocalSeconds > 0 && point.Stress.Pascals > 0;

    private static ScatterPoint Place(FlowPoint point, Items<Finding> findings) => new(point.Rate.ReciprocalSeconds, point.ApparentViscosity.MillipascalSeconds, tag: PointWords.Of(point, findings));
}
