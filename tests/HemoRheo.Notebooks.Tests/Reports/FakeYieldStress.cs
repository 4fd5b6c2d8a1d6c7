namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>A quantity that is no viscosity.</summary>
internal sealed record FakeYieldStress() : Measurand("yield stress", "τ_y", ShownUnits.Millipascal, true);
