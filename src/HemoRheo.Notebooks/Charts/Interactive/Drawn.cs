using OxyPlot;

namespace HemoRheo.Notebooks;

/// <summary>One picture, drawn twice: to be asked with the pointer, and still.</summary>
internal static class Drawn
{
    public static InteractiveChart Of(string title, PlotModel picture, int height) => new(title, PlotlyFigure.Of(picture, height), Still.Svg(picture, height));
}
