namespace HemoRheo;

/// <summary>One unknown of a joint fit.</summary>
/// <param name="parameter">Which parameter.</param>
/// <param name="curve">Number of the curve it belongs to, from 0; null where curves share it.</param>
/// <param name="wall">Where it runs to its bound; null where it cannot.</param>
internal sealed class JointColumn(LawParameter parameter, int? curve, JointWall? wall)
{
    /// <summary>Which parameter.</summary>
    public LawParameter Parameter => parameter;

    /// <summary>Number of the curve it belongs to, from 0; null where curves share it.</summary>
    public int? Curve => curve;

    /// <summary>Where it runs to its bound; null where it cannot.</summary>
    public JointWall? Wall => wall;

    /// <summary>Whether its fitting scale is a logarithm or a logit, so that a change of 1e-12 is small whatever the value.</summary>
    public bool IsLogarithmic => !double.IsInfinity(parameter.Lower);
}
