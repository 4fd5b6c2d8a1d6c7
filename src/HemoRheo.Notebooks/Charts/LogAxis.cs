using System.Globalization;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>A logarithmic axis with labels at 1, 2 and 5 of each decade, closer where the axis covers less than half a decade.</summary>
internal sealed class LogAxis : LogarithmicAxis
{
    private static readonly double[] Wide = [1];
    private static readonly double[] Usual = [1, 2, 5];
    private static readonly double[] Close = [1, 1.2, 1.4, 1.6, 1.8, 2, 2.5, 3, 3.5, 4, 4.5, 5, 6, 7, 8, 9];
    private static readonly double[] Closest = [.. Enumerable.Range(20, 180).Select(i => i / 20.0)];

    public LogAxis(AxisPosition position, string title)
    {
        Position = position;
        Title = title;
        LabelFormatter = value => value.ToString("G4", CultureInfo.InvariantCulture);
    }

    /// <inheritdoc/>
    public override void GetTickValues(out IList<double> majorLabelValues, out IList<double> majorTickValues, out IList<double> minorTickValues)
    {
        var decades = Math.Log10(ActualMaximum / ActualMinimum);
        majorTickValues = Ticks(decades > 4 ? Wide : decades > 0.7 ? Usual : decades > 0.12 ? Close : Closest);
        majorLabelValues = majorTickValues;
        minorTickValues = decades > 0.7 ? Ticks([.. Enumerable.Range(1, 9)]) : [];
    }

    private List<double> Ticks(double[] steps)
    {
        var ticks = new List<double>();
        for (var decade = (int)Math.Floor(Math.Log10(ActualMinimum)); decade <= Math.Log10(ActualMaximum); decade++)
        {
            ticks.AddRange(steps.Select(step => step * Math.Pow(10, decade)).Where(tick => tick >= ActualMinimum * 0.9999999 && tick <= ActualMaximum * 1.0000001));
        }

        return ticks;
    }
}
