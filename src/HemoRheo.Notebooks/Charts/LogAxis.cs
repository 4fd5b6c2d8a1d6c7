using System.Globalization;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>A logarithmic axis with labels where readers expect them: at 1, 2 and 5 of each decade, at more numbers where it covers about one, evenly in numbers where it covers less than half.</summary>
internal sealed class LogAxis : LogarithmicAxis
{
    private const double Narrow = 0.5;
    private const double OneDecade = 1.2;
    private const double ManyDecades = 4;

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
        majorTickValues = decades < Narrow ? Even() : OfDecades(decades > ManyDecades ? [1] : decades > OneDecade ? [1, 2, 5] : [1, 1.5, 2, 3, 4, 5, 6, 8]);
        majorLabelValues = majorTickValues;
        minorTickValues = decades < Narrow ? [] : OfDecades([1, 2, 3, 4, 5, 6, 7, 8, 9]);
    }

    private List<double> Even()
    {
        var rough = (ActualMaximum - ActualMinimum) / 6;
        var power = Math.Pow(10, Math.Floor(Math.Log10(rough)));
        var step = power * ((double[])[1, 2, 5, 10]).First(factor => factor * power >= rough);
        var first = (int)Math.Ceiling(ActualMinimum / step);
        return [.. Enumerable.Range(first, (int)Math.Floor(ActualMaximum / step) - first + 1).Select(count => Math.Round(count * step, 12))];
    }

    private List<double> OfDecades(double[] steps)
    {
        var ticks = new List<double>();
        for (var decade = (int)Math.Floor(Math.Log10(ActualMinimum)); decade <= Math.Log10(ActualMaximum); decade++)
        {
            ticks.AddRange(steps.Select(step => step * Math.Pow(10, decade)).Where(tick => tick >= ActualMinimum * 0.9999999 && tick <= ActualMaximum * 1.0000001));
        }

        return ticks;
    }
}
