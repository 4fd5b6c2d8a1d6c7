using static System.FormattableString;

namespace HemoRheo.App.Synthetic;

/// <summary>The study file of the synthetic cohort. The sizes it declares are the true ones.</summary>
internal static class CohortStudyFile
{
    public const string Name = "Synthetic cohort: residence at altitude";

    public static string Of(long seed) => Head(seed) + Layouts + Apparatus() + Analysis();

    private static string Head(long seed) => Invariant($$"""
        # Study file of the synthetic cohort. Every person, sample and reading in this folder is invented; see README.md.
        # Lengths, temperatures and the like carry their unit. Lines that begin with # are comments.

        name = "{{Name}}"
        seed = {{seed}}

        [files]
        exports = ["exports"]        # blood, as the rheometer's program exported it
        checks = ["checks"]          # the calibration fluid, measured every Monday
        samples = "samples.csv"      # hematocrit, plasma viscosity and time of draw beside
        people = "people.csv"        # which group a person belongs to


        """);

    private static string Apparatus() => Invariant($$"""
        [[instruments]]
        name = "{{CohortPlan.Instrument}}"
        torque_floor = "{{1e6 * TrueSizes.TorqueFloor:F3}} µN.m"
        torque_zero = "{{1e6 * TrueSizes.TorqueZero:F3}} µN.m"
        thermometer = "{{TrueSizes.Thermometer:F2}} K"
        check_every = "8 d"
        check_limit = "3 %"
        check_scatter = "0.4 %"
        adjusted = [{{CohortPlan.AdjustedAt:yyyy-MM-ddTHH:mm:sszzz}}]    # after the failed check of week {{CohortPlan.FailedWeek}}

        [[geometries]]
        name = "{{CohortPlan.Geometry}}"                    # concentric cylinders, inner one driven; invented dimensions, standard ratio
        inner_radius = "{{1000 * TrueSizes.InnerRadius:F2}} mm"
        outer_radius = "{{1000 * TrueSizes.OuterRadius:F2}} mm"
        length = "{{1000 * TrueSizes.Length:F2}} mm"
        end_factor = {{TrueSizes.EndFactor:F2}}

        [[fluids]]
        name = "{{CohortPlan.Fluid}}"
        kind = "certified"
        lot = "25-001"
        viscosity = "{{1000 * TrueSizes.CertifiedPascalSeconds:F3}} mPa.s"
        at = "{{TrueSizes.CertifiedAt:F0}} °C"
        expanded_uncertainty = "{{100 * TrueSizes.CertificateUncertainty:F2}} %"
        coverage_factor = {{TrueSizes.CertificateCoverage:F0}}
        per_kelvin = "{{100 * TrueSizes.FluidPerKelvin:F2}} %/K"
        per_kelvin_uncertainty = "{{100 * TrueSizes.FluidPerKelvinUncertainty:F2}} %/K"

        [[counters]]
        name = "{{CohortPlan.Counter}}"
        uncertainty = "{{TrueSizes.Hematocrit:F3}} L/L"
        shared_uncertainty = "{{TrueSizes.HematocritShared:F3}} L/L"


        """);

    private static string Analysis() => Invariant($$"""
        [blood]
        per_kelvin = "{{100 * TrueSizes.BloodPerKelvin:F1}} %/K"
        per_kelvin_uncertainty = "{{100 * TrueSizes.BloodPerKelvinUncertainty:F1}} %/K"
        plasma_per_kelvin = "{{100 * TrueSizes.PlasmaPerKelvin:F1}} %/K"
        plasma_uncertainty = "{{100 * TrueSizes.Plasma:F1}} %"

        [errors]
        relative = "{{100 * TrueSizes.Relative:F1}} %"
        floor = "{{1000 * TrueSizes.FloorPascals:F1}} mPa"
        known = true
        loading = "{{100 * TrueSizes.Loading:F1}} %"             # used only if no sample were loaded twice

        [screening]
        temperature = "37 °C"
        temperature_tolerance = "0.5 K"
        speed_tolerance = "5 %"
        longest_since_draw = "4 h"
        duplicate_tolerance = "0.1 %"
        lowest_hematocrit = "0.20 L/L"
        highest_hematocrit = "0.70 L/L"

        [analysis]
        laws = ["Newtonian", "Casson", "Quemada"]
        decide_by = "Quemada"
        standard_rates = ["1 1/s", "10 1/s", "100 1/s"]
        ramp = "down"                # after the pre-shear; the upward ramp serves hysteresis
        correct_bias = true
        level = 0.95

        [standard_hematocrit]
        hematocrit = "{{TrueSizes.StandardHematocrit:F2}} L/L"
        decide_by = "plasma-power"

        [reference]
        from_controls = true

        [[groups]]
        code = "{{CohortPlan.Controls}}"
        label = "residence in the lowland (controls)"
        controls = true

        [[groups]]
        code = "{{CohortPlan.SecondGroup}}"
        label = "residence at altitude"
        controls = false

        """);

    private const string Layouts = """
        # Exports of Mondays, Wednesdays and Fridays: one row a reading, speed and torque only.
        [[layouts]]
        name = "rows"
        shape = "rows"
        files = ["rows-*.csv"]
        encoding = "utf-8"
        separator = ";"
        decimal_sign = ","
        time_format = "yyyy-MM-dd HH:mm:sszzz"
        up_words = ["up"]
        down_words = ["down"]

        [layouts.columns]
        sample = { header = "Sample" }
        loading = { header = "Filling" }
        instrument = { header = "Rheometer" }
        geometry = { header = "Cup" }
        ramp = { header = "Ramp" }
        started_at = { header = "Started" }
        elapsed = { header = "Elapsed s", unit = "s" }
        temperature = { header = "Temp °C", unit = "°C" }
        set_speed = { header = "Set speed 1/min", unit = "1/min" }
        speed = { header = "Speed 1/min", unit = "1/min" }
        torque = { header = "Torque µN·m", unit = "µN.m" }

        # Exports of Tuesdays and Thursdays, and the checks: one block a filling, rate and stress.
        [[layouts]]
        name = "blocks"
        shape = "blocks"
        files = ["blocks-*.txt"]
        encoding = "utf-8"
        separator = ","
        decimal_sign = "."
        time_format = "yyyy-MM-dd HH:mm:sszzz"
        block_start = "Measurement"
        key_separator = ":"
        up_words = ["up"]
        down_words = ["down"]

        [layouts.keys]
        sample = { header = "Measurement" }
        loading = { header = "Filling" }
        instrument = { header = "Instrument" }
        geometry = { header = "Geometry" }
        fluid = { header = "Fluid" }
        started_at = { header = "Started" }
        reading_count = { header = "Readings" }

        [layouts.columns]
        ramp = { header = "Ramp" }
        elapsed = { header = "Elapsed [s]", unit = "s" }
        temperature = { header = "Temperature [°C]", unit = "°C" }
        set_shear_rate = { header = "Set rate [1/s]", unit = "1/s" }
        shear_rate = { header = "Rate [1/s]", unit = "1/s" }
        shear_stress = { header = "Stress [mPa]", unit = "mPa" }


        """;
}
