namespace HemoRheo;

/// <summary>A rheometer as the study file declares it.</summary>
/// <param name="Name">Name that exports and tables use.</param>
/// <param name="TorqueFloor">Torque below which readings are set aside, N.m; null when not declared (every reading is then marked).</param>
/// <param name="TorqueZero">Standard uncertainty of the day's torque zero, N.m, used where no blank run of the day tells it; 0 when declared as negligible.</param>
/// <param name="Thermometer">Standard uncertainty of the thermometer, K.</param>
/// <param name="CheckEvery">How long a passed check vouches for the instrument.</param>
/// <param name="CheckLimit">Largest relative error a check may show, e.g. 0.03.</param>
/// <param name="CheckScatter">Declared standard deviation of one check's ln error, used while the checks themselves have no degrees of freedom; null when not declared.</param>
/// <param name="Adjusted">Moments at which the instrument was adjusted or repaired: each starts a new period.</param>
/// <param name="TorqueResolution">Step in which it gives torques, N.m; its part of each reading's floor depends on the geometry. Null when not declared: nothing is added to the declared floor.</param>
public sealed record Instrument(
    string Name,
    double? TorqueFloor,
    double TorqueZero,
    double Thermometer,
    TimeSpan CheckEvery,
    double CheckLimit,
    double? CheckScatter,
    Items<DateTimeOffset> Adjusted,
    double? TorqueResolution = null)
{
    /// <summary>Whether the zero of a blank run is taken from every torque. Where it is not, its size is part of the uncertainty.</summary>
    public bool CorrectTorqueZero { get; init; }
}
