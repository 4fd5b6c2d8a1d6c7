namespace HemoRheo.App.Synthetic;

/// <summary>One visit of one invented person as it is planned.</summary>
/// <param name="Sample">Pseudonym of the sample.</param>
/// <param name="Person">Pseudonym of the person.</param>
/// <param name="Second">Whether the person belongs to the second group.</param>
/// <param name="Man">Whether the person is a man.</param>
/// <param name="Visit">Number of the visit.</param>
/// <param name="Week">Week of the study, from 1.</param>
/// <param name="StartedAt">Start of each loading.</param>
/// <param name="DrawnAt">When the blood was drawn.</param>
/// <param name="Rows">Whether it is exported as rows; else as blocks.</param>
/// <param name="PlasmaByCapillary">Whether plasma viscosity was measured by capillary; else on the rheometer.</param>
/// <param name="Fault">What is wrong with it on purpose.</param>
internal sealed record PlannedSample(
    string Sample,
    string Person,
    bool Second,
    bool Man,
    int Visit,
    int Week,
    IReadOnlyList<DateTimeOffset> StartedAt,
    DateTimeOffset DrawnAt,
    bool Rows,
    bool PlasmaByCapillary,
    PlantedFault Fault);
