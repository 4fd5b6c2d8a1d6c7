namespace HemoRheo;

/// <summary>A moment at which a change may have begun, and how well it fits.</summary>
/// <param name="Day">Days after the first check.</param>
/// <param name="Width">Days that it stands for.</param>
/// <param name="SquaresOfTime">Sum of squares of the regressor about its mean.</param>
/// <param name="Slope">Change per unit of the regressor.</param>
/// <param name="Residual">Residual sum of squares.</param>
/// <param name="LogWeight">Log of the likelihood averaged over the other constants.</param>
internal readonly record struct ChangeMoment(double Day, double Width, double SquaresOfTime, double Slope, double Residual, double LogWeight);
