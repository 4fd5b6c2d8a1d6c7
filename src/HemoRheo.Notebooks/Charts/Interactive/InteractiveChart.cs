using Plotly.NET;

namespace HemoRheo;

/// <summary>A chart for a notebook: it can be zoomed and asked with the pointer, needs no network, and shows a still picture of the same wherever scripts do not run.</summary>
/// <param name="Title">What it shows, in one line.</param>
/// <param name="Figure">The figure, for those who want to change it.</param>
/// <param name="StillPicture">The same as a still picture: SVG text.</param>
public sealed record InteractiveChart(string Title, GenericChart Figure, string StillPicture)
{
    /// <inheritdoc/>
    public override string ToString() => $"chart: {Title}";
}
