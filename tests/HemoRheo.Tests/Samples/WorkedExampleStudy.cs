using System.Globalization;
using System.Text;

namespace HemoRheo.Tests.Samples;

/// <summary>The worked example as a study in a folder, read and analyzed through the public API. Source: tests/ReferenceData/worked-example.</summary>
public sealed class WorkedExampleStudy
{
    /// <summary>Opens, reads and analyzes it once for all tests of a class.</summary>
    public WorkedExampleStudy()
    {
        using var folder = StudyFolder.Empty();
        Write(folder);
        var study = Study.Open(folder.StudyFile);
        Readings = study.ReadExports();
        Analyzed = study.Evaluate(Readings);
    }

    public StudyReadings Readings { get; }

    public AnalyzedStudy Analyzed { get; }

    internal static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows(string file) => ReferenceTable.Read("worked-example", file);

    private static void Write(StudyFolder folder)
    {
        var exports = new StringBuilder("sample;loading;instrument;fluid;started at;temperature [°C];rate [1/s];stress [Pa]\n");
        var days = Rows("samples.csv").ToDictionary(row => row["sample"], row => row["day"]);
        foreach (var row in Rows("readings.csv"))
        {
            exports.Append(CultureInfo.InvariantCulture, $"{row["sample"]};{row["loading"]};R1;;{Time(days[row["sample"]], 10)};{row["temperature_C"]};{row["shear_rate_per_s"]};{row["shear_stress_Pa"]}\n");
        }

        var checks = new StringBuilder("sample;loading;instrument;fluid;started at;temperature [°C];rate [1/s];stress [Pa]\n");
        foreach (var row in Rows("checks.csv"))
        {
            // One reading at 128 1/s: a power of two, so that stress over rate is the viscosity of the table to the last bit.
            checks.Append(CultureInfo.InvariantCulture, $"check {row["day"]};1;R1;oil;{Time(row["day"], 8)};{row["temperature_C"]};128;{128 * row.Number("viscosity_Pa_s"):R}\n");
        }

        var samples = new StringBuilder("sample,person,visit,drawn_at,hematocrit [L/L],counter,plasma_viscosity [Pa.s],plasma_temperature [°C],plasma_instrument\n");
        foreach (var row in Rows("samples.csv"))
        {
            samples.Append(CultureInfo.InvariantCulture, $"{row["sample"]},P-{row["sample"]},1,{Time(row["day"], 9)},{row["hematocrit_L_per_L"]},counter,{row["plasma_viscosity_Pa_s"]},{row["plasma_temperature_C"]},R1\n");
        }

        var given = Rows("study.csv").ToDictionary(row => row["key"], row => row["value"]);
        folder.Write("exports/blood.csv", exports.ToString()).Write("checks/oil.csv", checks.ToString()).Write("samples.csv", samples.ToString());
        folder.Write("study.toml", StudyText(given));
    }

    private static string Time(string day, int hour) => $"2026-03-{1 + int.Parse(day[1..], CultureInfo.InvariantCulture):00} {hour:00}:00:00+01:00";

    private static string StudyText(Dictionary<string, string> given) => $$"""
        name = "worked example"
        seed = 1
        [files]
        exports = ["exports"]
        checks = ["checks"]
        samples = "samples.csv"
        [[layouts]]
        name = "rows"
        shape = "rows"
        files = ["*.csv"]
        separator = ";"
        decimal_sign = "."
        time_format = "yyyy-MM-dd HH:mm:sszzz"
        [layouts.columns]
        sample = { header = "sample" }
        loading = { header = "loading" }
        instrument = { header = "instrument" }
        fluid = { header = "fluid" }
        started_at = { header = "started at" }
        temperature = { header = "temperature [°C]", unit = "°C" }
        shear_rate = { header = "rate [1/s]", unit = "1/s" }
        shear_stress = { header = "stress [Pa]", unit = "Pa" }
        [[instruments]]
        name = "R1"
        torque_zero = "0 N.m"
        thermometer = "{{given["thermometer_u_K"]}} K"
        check_every = "8 d"
        check_limit = "8 %"
        [[fluids]]
        name = "oil"
        kind = "certified"
        lot = "invented"
        viscosity = "{{given["certified_Pa_s"]}} Pa.s"
        at = "{{given["certified_at_C"]}} °C"
        expanded_uncertainty = "{{given["certificate_U_relative"]}} 1"
        coverage_factor = {{given["certificate_k"]}}
        per_kelvin = "{{given["fluid_beta_per_K"]}} 1/K"
        per_kelvin_uncertainty = "{{given["fluid_beta_u_per_K"]}} 1/K"
        [[counters]]
        name = "counter"
        uncertainty = "{{given["hematocrit_u"]}} L/L"
        shared_uncertainty = "{{given["hematocrit_shared_u"]}} L/L"
        [blood]
        per_kelvin = "{{given["blood_beta_per_K"]}} 1/K"
        per_kelvin_uncertainty = "{{given["blood_beta_u_per_K"]}} 1/K"
        plasma_per_kelvin = "{{given["plasma_beta_per_K"]}} 1/K"
        plasma_uncertainty = "{{given["plasma_u_relative"]}} 1"
        [errors]
        relative = "{{given["relative"]}} 1"
        floor = "{{given["floor_Pa"]}} Pa"
        known = true
        [analysis]
        laws = ["Quemada", "Casson"]
        decide_by = "Quemada"
        standard_rates = ["1 1/s", "10 1/s", "100 1/s"]
        [standard_hematocrit]
        hematocrit = "0.45 L/L"
        decide_by = "plasma-power"
        [reference]
        from_controls = false
        """;
}
