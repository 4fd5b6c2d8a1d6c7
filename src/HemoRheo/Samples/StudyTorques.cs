namespace HemoRheo;

/// <summary>What the torques of a study rest on, as a table.</summary>
public static class StudyTorques
{
    /// <summary>One row a loading: blank run of the day, last blank run with its age, declared floor, or nothing, with zero, noise and the floor that follows.</summary>
    /// <param name="analyzed">The analyzed study.</param>
    public static Table TorqueTable(this AnalyzedStudy analyzed) => Table
        .Of("sample", "loading", "instrument", "started at", "torque rests on", "blank run", "blank age", "torque floor", "torque zero", "torque zero uncertainty", "torque noise", "zero corrected")
        .WithRows(analyzed.Samples.SelectMany(sample => sample.Loadings), loading => Row(loading.Recording, loading.Curve.Torque));

    private static Cell[] Row(Recording recording, TorqueTrust? torque)
    {
        var empty = torque?.At(null);
        return
        [
            recording.Sample, recording.Loading, recording.Instrument, recording.StartedAt, (torque?.Basis ?? TorqueBasis.None).Words(), torque?.BlankRun, torque?.Age?.TotalDays,
            1e6 * torque?.Floor(), 1e6 * empty?.Zero, 1e6 * empty?.Uncertainty, 1e6 * empty?.Noise, torque?.Corrected == true,
        ];
    }
}
