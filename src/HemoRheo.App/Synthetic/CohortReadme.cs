using static System.FormattableString;

namespace HemoRheo.App.Synthetic;

/// <summary>The README of the synthetic cohort.</summary>
internal static class CohortReadme
{
    public static string Of(long seed) => Invariant($$"""
        # Synthetic cohort

        No person is in here. Every person, blood sample, reading, instrument and calibration fluid in this folder is invented by a program
        from the seed {{seed}}, so that the whole way from export file to result can be shown and tested where the truth is known.
        For research use only; no number here says anything about anybody's health.

        Make it again, byte for byte on one kind of machine (elsewhere to the last printed digit):

            dotnet run --project src/HemoRheo.App -c Release -- synthesize <folder> --seed {{seed}}

        ## What it looks like

        | file | what |
        |---|---|
        | `study.toml` | the study file; the sizes of error it declares are the true ones |
        | `people.csv` | {{CohortPlan.People}} people: 48 controls (residence in the lowland), 32 with residence at altitude |
        | `samples.csv` | {{CohortPlan.People + 4}} samples (four controls came twice), with hematocrit, plasma viscosity, fibrinogen and time of draw |
        | `exports/rows-*.csv` | a file a day: semicolons, decimal comma, only speed and torque |
        | `exports/blocks-*.txt` | a file a sample: key and value lines, decimal point, shear rate and shear stress |
        | `checks/` | five weekly checks with a calibration fluid |
        | `truth/` | what is true; the analysis never reads it |

        Half of the samples were loaded twice. Each loading has a downward ramp after a pre-shear and an upward ramp, 13 shear rates from 300 to 0.7 1/s.
        Plasma viscosity of every third sample was measured by capillary, of the others on the rheometer. Summer time begins between weeks 3 and 4.

        ## What is true

        Blood follows the Quemada law. Centers lie near the coefficients of Cokelet 1987; viscosity depends on hematocrit, plasma and person.
        People at altitude have a hematocrit higher by {{TruePopulation.HematocritRise:F3}} L/L and, beyond hematocrit, a viscosity that is higher at low shear rates (`truth/effects.csv`).
        "Standard" in `truth/viscosities.csv` is the plasma power rule applied to true numbers.

        A stress is read as tau(rate) exp(loading + instrument + day - beta (T - 37)) + zero + noise, with these standard deviations:

        | part | size |
        |---|---|
        | loading | {{100 * TrueSizes.Loading:F1}} % |
        | instrument, between adjustments | within {{100 * TrueSizes.LargestBias:F1}} % either way |
        | day | {{100 * TrueSizes.Day:F1}} %; a check's filling {{100 * TrueSizes.CheckFilling:F1}} % |
        | thermometer | {{TrueSizes.Thermometer:F2}} K, one error for all |
        | temperature coefficient of blood | {{TrueSizes.BloodPerKelvinUncertainty:F3}} of {{TrueSizes.BloodPerKelvin:F3}} 1/K, one error for all |
        | torque zero of the day | {{1e9 * TrueSizes.TorqueZero:F0}} nN.m |
        | noise of a reading | {{100 * TrueSizes.Relative:F1}} % and {{1000 * TrueSizes.FloorPascals:F1}} mPa |
        | hematocrit | {{TrueSizes.Hematocrit:F3}} L/L a sample, {{TrueSizes.HematocritShared:F3}} L/L shared |
        | plasma viscosity | {{100 * TrueSizes.Plasma:F1}} % a sample |

        A cohort is one draw: made from other seeds, about one interval in twenty misses the truth, that of the effect between the groups included.

        Left out: points of a ramp are independent, no sample sediments or slips, and the gap's uneven shear is not simulated (rate and stress are the representative ones of ISO 3219).

        ## What is wrong on purpose

        - The instrument changes in week 3 and reads {{100 * TrueSizes.Change:F0}} % too high until it is adjusted after week 4. The check of week {{CohortPlan.FailedWeek}} fails:
          the samples of week 3 are then in doubt (some were measured before the change; nobody in the lab could know), those of week 4 failed.
        - A temperature excursion during one recording, a sample measured too long after its draw, a file cut in the middle of a number (`truth/faults.csv`).

        """);
}
