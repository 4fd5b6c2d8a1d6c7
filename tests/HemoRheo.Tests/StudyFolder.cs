using System.Text;

namespace HemoRheo.Tests;

/// <summary>A study in a folder of its own that goes with the test: a small valid study file, tables and writers for both layouts.</summary>
internal sealed class StudyFolder : IDisposable
{
    private StudyFolder() => Root = Directory.CreateTempSubdirectory("hemorheo-").FullName;

    public string Root { get; }

    public string StudyFile => PathOf("study.toml");

    /// <summary>A folder with nothing in it.</summary>
    public static StudyFolder Empty() => new();

    /// <summary>A valid study of the template with empty exports, samples and people.</summary>
    public static StudyFolder Valid()
    {
        var folder = new StudyFolder();
        folder.Write("study.toml", Study.Template());
        folder.Write("samples.csv", SamplesHeader);
        folder.Write("people.csv", "person,group\n");
        Directory.CreateDirectory(folder.PathOf("exports"));
        Directory.CreateDirectory(folder.PathOf("checks"));
        return folder;
    }

    public const string SamplesHeader = "sample,person,visit,drawn_at,hematocrit [L/L],counter,plasma_viscosity [mPa.s],plasma_temperature [°C],plasma_instrument\n";

    public const string RowsHeader = "sample;loading;instrument;geometry;fluid;started at;ramp;temperature [°C];time [s];speed asked [rpm];speed [rpm];torque [µN.m]\n";

    public const string BlockHeader = "Ramp,Temperature [°C],Rate asked [1/s],Rate [1/s],Stress [mPa]\n";

    public string PathOf(string path) => Path.Combine(Root, path);

    public StudyFolder Write(string path, string text)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(PathOf(path))!);
        File.WriteAllText(PathOf(path), text, new UTF8Encoding(false));
        return this;
    }

    public StudyFolder Write(string path, byte[] bytes)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(PathOf(path))!);
        File.WriteAllBytes(PathOf(path), bytes);
        return this;
    }

    /// <summary>One more row of the samples table and, the first time, of the people table.</summary>
    public StudyFolder AddSample(string sample, string person, string hematocrit = "0.45", string drawnAt = "2026-03-02T08:00:00+01:00", string group = "A")
    {
        File.AppendAllText(PathOf("samples.csv"), $"{sample},{person},1,{drawnAt},{hematocrit},centrifuge,1.22,37,R1\n");
        if (!File.ReadAllText(PathOf("people.csv")).Contains($"\n{person},", StringComparison.Ordinal)) File.AppendAllText(PathOf("people.csv"), $"{person},{group}\n");
        return this;
    }

    /// <summary>A row of the rows layout: decimal comma, speed and torque.</summary>
    public static string Row(string sample, string speed, string torque, int loading = 1, string startedAt = "2026-03-02 09:00:00 +01:00", string ramp = "down", string fluid = "", string temperature = "37,0") =>
        $"{sample};{loading};R1;CYL-1;{fluid};{startedAt};{ramp};{temperature};10,0;{speed};{speed};{torque}\n";

    /// <summary>A block of the blocks layout: decimal point, rate and stress.</summary>
    public static string Block(string sample, IReadOnlyList<(string Rate, string Stress)> readings, int loading = 1, string startedAt = "2026-03-02T09:00:00+01:00", string ramp = "down") =>
        $"Sample: {sample}\nLoading: {loading}\nInstrument: R1\nStart: {startedAt}\nReadings: {readings.Count}\n{BlockHeader}"
        + string.Concat(readings.Select(reading => $"{ramp},37.0,{reading.Rate},{reading.Rate},{reading.Stress}\n"));

    public void Dispose() => Directory.Delete(Root, recursive: true);
}
