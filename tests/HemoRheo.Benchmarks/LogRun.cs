using System.Diagnostics;
using System.Globalization;
using HemoRheo.Benchmarks.SimulatedCharts;
using static System.FormattableString;

namespace HemoRheo.Benchmarks;

/// <summary>Writes instrument logs: to time them, and as the program that a test kills.</summary>
internal static class LogRun
{
    /// <summary>How long a log of so many daily checks takes to read, to extend by one check, to verify, to export and to chart.</summary>
    public static IEnumerable<string> Times(int checks)
    {
        var folder = Directory.CreateTempSubdirectory("hemorheo-log-");
        var path = Path.Combine(folder.FullName, "R1.log");
        try
        {
            var log = InstrumentLog.Create(path, "R1", InventedLoggedCheck.Start, "benchmark");
            var random = RandomStream.Of(20261201, "log", 0);
            var clock = Stopwatch.StartNew();
            for (var day = 0; day < checks; day++) Record(log, day, 0.005 * random.Normal());
            yield return Invariant($"{checks} checks recorded one by one: {clock.Elapsed.TotalMilliseconds / checks:F1} ms each, {new FileInfo(path).Length / 1e6:F1} MB");
            for (var round = 1; round <= 3; round++)
            {
                var day = checks + round;
                yield return Invariant($"round {round}: load {Time(() => InstrumentLog.Open(path).Read())}, record {Time(() => Record(log, day, 0))}, verify {Time(() => log.Verify())}, export {Time(() => log.ToCsv())}, read and chart {Time(() => log.Read().ControlChart())}");
            }
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    /// <summary>Records checks until it has recorded so many or is killed, and says the number of each once it is recorded.</summary>
    public static int Write(string path, string name, int checks)
    {
        var log = InstrumentLog.Open(path);
        using var said = new StreamWriter(Console.OpenStandardOutput()) { AutoFlush = true, NewLine = "\n" };
        for (var i = 0; i < checks; i++)
        {
            var at = InventedLoggedCheck.Start.AddMinutes(i);
            said.WriteLine(log.Append(InventedLoggedCheck.Of(Invariant($"{name}-{i}"), at, 0.001), at, name).Number.ToString(CultureInfo.InvariantCulture));
        }

        return 0;
    }

    private static void Record(InstrumentLog log, int day, double error)
    {
        var at = InventedLoggedCheck.Start.AddDays(day);
        log.Append(InventedLoggedCheck.Of(Invariant($"C{day}"), at, error), at.AddMinutes(10), "benchmark");
    }

    private static string Time(Action action)
    {
        var (clock, processor) = (Stopwatch.StartNew(), Environment.CpuUsage.TotalTime);
        action();
        return Invariant($"{clock.Elapsed.TotalMilliseconds:F0} ms ({(Environment.CpuUsage.TotalTime - processor).TotalMilliseconds:F0} of processors)");
    }
}
