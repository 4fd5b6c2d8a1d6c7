namespace HemoRheo.Tests.Architecture;

/// <summary>Shows every fault of a check at once, one a line.</summary>
internal static class Faults
{
    public static void None(IEnumerable<string> faults)
    {
        var found = faults.Distinct().ToArray();
        if (found.Length > 0) Assert.Fail($"{found.Length} faults:\n{string.Join('\n', found)}");
    }
}
