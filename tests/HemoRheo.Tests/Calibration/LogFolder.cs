using HemoRheo.Benchmarks.SimulatedCharts;
using Microsoft.Data.Sqlite;

namespace HemoRheo.Tests.Calibration;

/// <summary>A folder with the log of a rheometer that goes with the test.</summary>
internal sealed class LogFolder : IDisposable
{
    internal static readonly DateTimeOffset Start = InventedLoggedCheck.Start;

    internal LogFolder() => Log = InstrumentLog.Create(Path, "R1", Start, "A. Miller");

    internal string Root { get; } = Directory.CreateTempSubdirectory("hemorheo-log-").FullName;

    internal string Path => System.IO.Path.Combine(Root, "R1.log");

    internal InstrumentLog Log { get; }

    /// <summary>Records a check taken so many days after the start, ten minutes later.</summary>
    internal LogEntry Check(int day, double error = 0.001, int filling = 1) =>
        Log.Append(InventedLoggedCheck.Of($"C{day}", Start.AddDays(day), error, filling) with { ExportDigest = $"{day}/{filling}" }, Start.AddDays(day).AddMinutes(10), "A. Miller");

    /// <summary>Changes the file as somebody with another program would.</summary>
    internal void Tamper(string statements, string? path = null)
    {
        using var connection = new SqliteConnection($"Data Source={path ?? Path};Pooling=False");
        connection.Open();
        using var command = connection.CreateCommand();
        command.CommandText = $"DROP TRIGGER IF EXISTS entry_stays_as_it_is; DROP TRIGGER IF EXISTS entry_stays; {statements}";
        command.ExecuteNonQuery();
    }

    public void Dispose()
    {
        foreach (var file in Directory.GetFiles(Root)) File.SetAttributes(file, FileAttributes.Normal);
        Directory.Delete(Root, recursive: true);
    }
}
