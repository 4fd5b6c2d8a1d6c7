using OxyPlot;

namespace HemoRheo.Notebooks;

/// <summary>Measures text as a browser draws it: in pixels where the underlying measure is in points, with a little room for other fonts.</summary>
internal sealed class PixelText() : PdfRenderContext(Still.Width, Still.Width, OxyColors.White)
{
    private const double PixelsPerPoint = 96.0 / 72;
    private const double Room = 1.06;

    /// <inheritdoc/>
    public override OxySize MeasureText(string text, string fontFamily, double fontSize, double fontWeight)
    {
        var points = base.MeasureText(text, fontFamily, fontSize, fontWeight);
        return new(points.Width * PixelsPerPoint * Room, points.Height * PixelsPerPoint);
    }
}
