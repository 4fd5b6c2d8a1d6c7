using OxyPlot;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>The two axes of a picture, as a figure takes them.</summary>
internal sealed class PlotlyAxes
{
    public PlotlyAxes(PlotModel model)
    {
        X = new(model.Axes.First(axis => axis.Position is AxisPosition.Bottom or AxisPosition.Top));
        Y = new(model.Axes.First(axis => axis.Position is AxisPosition.Left or AxisPosition.Right));
    }

    public PlotlyAxis X { get; }

    public PlotlyAxis Y { get; }
}
