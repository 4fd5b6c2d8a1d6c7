using OxyPlot;

namespace HemoRheo.Notebooks;

/// <summary>Colors of the still pictures. Every distinction made by color is made by shape or line style too, so that pictures read in grey.</summary>
internal static class Ink
{
    /// <summary>Text and axes.</summary>
    public static OxyColor Text { get; } = OxyColor.FromRgb(0x22, 0x26, 0x2b);

    /// <summary>The one accent color.</summary>
    public static OxyColor Accent { get; } = OxyColor.FromRgb(0x0f, 0x5c, 0x7a);

    /// <summary>What needs a look.</summary>
    public static OxyColor Alert { get; } = OxyColor.FromRgb(0xb3, 0x4a, 0x00);

    /// <summary>Second and later members of a family.</summary>
    public static OxyColor Muted { get; } = OxyColor.FromRgb(0x5c, 0x63, 0x6b);

    /// <summary>Grid lines.</summary>
    public static OxyColor Grid { get; } = OxyColor.FromRgb(0xe4, 0xe7, 0xea);

    /// <summary>The ground of a reference range.</summary>
    public static OxyColor Range { get; } = OxyColor.FromRgb(0xd6, 0xe6, 0xec);

    /// <summary>The interval of a limit.</summary>
    public static OxyColor LimitInterval { get; } = OxyColor.FromRgb(0xa9, 0xc9, 0xd6);

    /// <summary>The ground of a doubtful stretch of time.</summary>
    public static OxyColor Doubt { get; } = OxyColor.FromRgb(0xf8, 0xe9, 0xd8);

    /// <summary>The ground of a stretch of time in which an instrument had failed.</summary>
    public static OxyColor Failure { get; } = OxyColor.FromRgb(0xee, 0xc9, 0xa8);

    /// <summary>Color of the member of a family of lines.</summary>
    /// <param name="index">Its place, from 0.</param>
    public static OxyColor Member(int index) => (index % 3) switch { 0 => Accent, 1 => Alert, _ => Muted };

    /// <summary>Marker of the member of a family of points.</summary>
    /// <param name="index">Its place, from 0.</param>
    public static MarkerType Marker(int index) => (index % 4) switch { 0 => MarkerType.Circle, 1 => MarkerType.Square, 2 => MarkerType.Triangle, _ => MarkerType.Diamond };

    /// <summary>Line style of the member of a family of lines.</summary>
    /// <param name="index">Its place, from 0.</param>
    public static LineStyle Line(int index) => (index % 3) switch { 0 => LineStyle.Solid, 1 => LineStyle.Dash, _ => LineStyle.DashDot };
}
