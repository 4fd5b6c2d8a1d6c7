using System.Globalization;
using System.Text;

namespace HemoRheo.Benchmarks;

/// <summary>Writes a simulated study as a lab would have it: a study file, exports, checks and tables.</summary>
internal static class SimulatedFolder
{
    /// <summary>Writes the study into a folder and gives the path of its study file.</summary>
    public static string Write(SimulatedStudy study, string folder)
    {
        Directory.CreateDirectory(Path.Combine(folder, "exports"));
        Directory.CreateDirectory(Path.Combine(folder, "checks"));
        const string header = "sample;loading;instrument;fluid;started at;temperature [°C];rate [1/s];stress [Pa]\n";
        var blood = new StringBuilder(header);
        var samples = new StringBuilder("sample,person,visit,drawn_at,hematocrit [L/L],counter,plasma_viscosity [Pa.s],plasma_temperature [°C],plasma_instrument\n");
        foreach (var sample in study.Samples)
        {
            samples.Append(CultureInfo.InvariantCulture, $"{sample.Id},P-{sample.Id},1,{Time(sample.At.AddHours(-1))},{sample.Hematocrit:R},counter,{sample.PlasmaPascalSeconds:R},{sample.PlasmaCelsius:R},R1\n");
            for (var l = 0; l < sample.Loadings.Count; l++)
            {
                var (stresses, celsius) = sample.Loadings[l];
                for (var i = 0; i < stresses.Length; i++)
                {
                    blood.Append(CultureInfo.InvariantCulture, $"{sample.Id};{l + 1};R1;;{Time(sample.At.AddMinutes(10 * l))};{celsius:R};{SimulatedStudy.Rates[i]:R};{stresses[i]:R}\n");
                }
            }
        }

        var checks = new StringBuilder(header);
        foreach (var check in study.CheckReadings)
        {
            checks.Append(CultureInfo.InvariantCulture, $"{check.Name};1;R1;oil;{Time(check.At)};{check.Celsius:R};100;{100 * check.PascalSeconds:R}\n");
        }

        File.WriteAllText(Path.Combine(folder, "exports", "blood.csv"), blood.ToString());
        File.WriteAllText(Path.Combine(folder, "checks", "oil.csv"), checks.ToString());
        File.WriteAllText(Path.Combine(folder, "samples.csv"), samples.ToString());
        var file = Path.Combine(folder, "study.toml");
        File.WriteAllText(file, StudyText);
        return file;
    }

    private static string Time(DateTimeOffset at) => at.ToString("yyyy-MM-dd HH:mm:sszzz", CultureInfo.InvariantCulture);

    private const string StudyText = """
        name = "simulated"
        seed = 20261201
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
        thermometer = "0.1 K"
        check_every = "30 d"
        check_limit = "20 %"
        [[fluids]]
        name = "oil"
        kind = "certified"
        lot = "simulated"
        viscosity = "6.25 mPa.s"
        at = "25 °C"
        expanded_uncertainty = "0.4 %"
        coverage_factor = 2
        per_kelvin = "2.2 %/K"
        per_kelvin_uncertainty = "0.03 %/K"
        [[counters]]
        name = "counter"
        uncertainty = "0.006 L/L"
        shared_uncertainty = "0.003 L/L"
        [blood]
        per_kelvin = "2.6 %/K"
        per_kelvin_uncertainty = "0.4 %/K"
        plasma_per_kelvin = "2 %/K"
        plasma_uncertainty = "1 %"
        [errors]
        relative = "1 %"
        floor = "0.3 mPa"
        known = true
        [screening]
        temperature_tolerance = "5 K"
        longest_since_draw = "8 h"
        [analysis]
        laws = ["Casson"]
        decide_by = "Casson"
        standard_rates = ["1 1/s", "10 1/s", "100 1/s"]
        [standard_hematocrit]
        hematocrit = "0.45 L/L"
        decide_by = "plasma-power"
        [reference]
        from_controls = false
        """;
}
