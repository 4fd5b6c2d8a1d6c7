namespace HemoRheo;

/// <summary>A study file that cannot be used: every fault of it at once.</summary>
/// <param name="faults">The faults, in file order.</param>
public sealed class StudyFileException(Items<StudyFileFault> faults)
    : Exception($"The study file has {faults.Count} fault{(faults.Count == 1 ? "" : "s")}:{string.Concat(faults.Select(fault => $"\n  {fault}"))}")
{
    /// <summary>The faults, in file order.</summary>
    public Items<StudyFileFault> Faults { get; } = faults;
}
