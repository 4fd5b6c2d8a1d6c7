using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>Laws compared on one curve: the readings and every law as percent of one law, so that small differences are seen.</summary>
internal static class ComparisonChart
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 400;

    private const int Most = 6;

    /// <summary>The picture.</summary>
    /// <exception cref="InvalidOperationException">No law could be fitted.</exception>
    public static PlotModel Model(LawComparison comparison)
    {
        var drawn = comparison.Laws.Where(law => law.Fit.Usable).OrderBy(law => law.Difference ?? double.PositiveInfinity).Take(Most).ToArray();
        if (drawn.Length == 0) throw new InvalidOperationException($"No law could be fitted, so there is nothing to draw. {comparison.Verdict}");
        var basis = drawn[0].Fit;
        var kept = basis.Curve.KeptRates!.Value;
        double[] estimates = [.. basis.Parameters.Select(parameter => parameter.Estimate)];
        double Percent(double rate, double pascals) => 100 * (pascals / basis.Law.Stress(new(rate), estimates).Pascals - 1);
        var points = basis.Curve.Points.Select(point => new DataPoint(point.Rate.ReciprocalSeconds, Percent(point.Rate.ReciprocalSeconds, point.Stress.Pascals))).ToArray();
        var lines = drawn.Select(law => LawLine.Of(law.Fit).Select(point => new DataPoint(point.Rate, Percent(point.Rate, point.Viscosity / 1000 * point.Rate))).ToArray()).ToArray();
        // A law that is contradicted may leave the picture; what the data cannot part stays in it.
        var near = lines.Where((_, i) => drawn[i].Against is null).SelectMany(line => line);
        var reach = Math.Max(1, 1.5 * points.Concat(near).Max(point => Math.Abs(point.Y)));

        var model = Still.Model();
        model.Axes.Add(Still.Log(AxisPosition.Bottom, "shear rate, 1/s", kept.Lower / 1.3, kept.Upper * 1.3));
        model.Axes.Add(Still.Linear(AxisPosition.Left, $"difference of shear stress from {basis.Law.Name}, %", -reach, reach));
        model.Legends.Add(Still.Legend());
        for (var i = 0; i < drawn.Length; i++)
        {
            var line = new LineSeries { Color = Ink.Member(i), LineStyle = Ink.Line(i), StrokeThickness = i < 3 ? 1.8 : 1, Title = Title(drawn[i]) };
            line.Points.AddRange(lines[i]);
            model.Series.Add(line);
        }

        model.Series.Add(Still.Points(points, Ink.Text, MarkerType.Circle, 4, title: "readings"));
        return model;
    }

    private static string Title(ComparedLaw law) => law.Difference is { } difference ? FormattableString.Invariant($"{law.Law.Name} (AICc +{difference:F1})") : law.Law.Name;
}
