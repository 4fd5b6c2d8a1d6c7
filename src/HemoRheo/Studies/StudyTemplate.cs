namespace HemoRheo;

/// <summary>The commented study file to start from.</summary>
internal static class StudyTemplate
{
    public const string Text = """
# A study for HemoRheo. Research use only. Text after # is for people.
# A value with a unit is a text, "12.5 mm", with a decimal point. Nothing is guessed: replace every value by your own.
# Lines that begin with "# key =" show a key that may be left out; the value shown is an example or the default.

name = "My study"
seed = 1                                  # of every random stream; any whole number

[files]                                   # paths below the folder of this file
exports = ["exports"]                     # files or folders with exports of blood
checks = ["checks"]                       # exports of instrument checks
# blanks = ["blanks"]                     # exports of blank runs: turning with nothing in the gap; they show torque zero and noise
samples = "samples.csv"                   # comma, decimal point, UTF-8; units in the header: hematocrit [L/L], plasma_viscosity [mPa.s]
people = "people.csv"                     # person,group; leave out where no groups are compared
# check_table = "checks.csv"              # what exports of checks and blank runs do not say: check,fluid,instrument,started_at,geometry
# allowed_columns = ["collection_name"]   # columns that look like direct identifiers; allowed to stand there, never read

# The three tables have a header row, comma, decimal point, and are UTF-8. Columns stand in any order; the unit stands in the header.
# A field may be left empty where its column is not required. Identifiers are pseudonyms of letters, digits, - _ and . only.
#
# samples.csv, one row a sample, such as
#   sample,person,visit,drawn_at,hematocrit [L/L],counter,plasma_viscosity [mPa.s],plasma_temperature [°C],plasma_instrument
#   S-001,P-001,1,2026-03-02T08:00:00+01:00,0.45,centrifuge,1.22,37,R1
#
#   sample                      required; as in the exports
#   person                      required, unless the exports say it
#   visit                       whole number from 1; left out: as the exports say, or 1
#   drawn_at                    date, time and offset; left out: nothing is said of the time since the draw
#   hematocrit [L/L] or [%]     left out: no values at the standard hematocrit
#   counter                     required with hematocrit: name of one of [[counters]]
#   plasma_viscosity [mPa.s]    left out: no relative viscosity, and no standard hematocrit by plasma-power
#   plasma_temperature [°C]     temperature at which it was measured
#   plasma_instrument           what measured it: one of [[instruments]], whose checks then correct it, or another name
#   plasma_measured_at          date, time and offset; left out: measured with the blood
#   fibrinogen [g/L]            may be left out
#   instrument                  required where the exports do not say it: name of one of [[instruments]]
#   geometry                    required where the exports give speed and torque and do not say it
#   started_at                  required where the exports do not say it: date, time and offset
#
# people.csv, one row a person, such as
#   person,group
#   P-001,A
#
#   person                      required; as in the samples table
#   group                       required: code of one of [[groups]]
#
# checks.csv, only where exports of checks or blank runs do not say all of it, one row a check or blank run
#   check                       required; what their exports have as sample
#   fluid                       required for checks where the exports do not say it: name of one of [[fluids]]; empty for blank runs
#   instrument, geometry, started_at    as in the samples table

# One section a kind of export. Headers are the exact texts of the export.
[[layouts]]
name = "rows"                             # a header row, then one row a reading
shape = "rows"
files = ["*.csv"]
encoding = "utf-8"                        # default utf-8
separator = ";"
decimal_sign = ","
time_format = "yyyy-MM-dd HH:mm:ss zzz"   # zzz, the offset, is part of it
up_words = ["up"]
down_words = ["down"]
# last_line_ends = false                  # where whole files end without a line end

[layouts.columns]
sample = { header = "sample" }
loading = { header = "loading" }
instrument = { header = "instrument" }
geometry = { header = "geometry" }
fluid = { header = "fluid" }              # filled in checks
started_at = { header = "started at" }
ramp = { header = "ramp" }
temperature = { header = "temperature [°C]", unit = "°C" }
elapsed = { header = "time [s]", unit = "s" }
set_speed = { header = "speed asked [rpm]", unit = "rpm" }
speed = { header = "speed [rpm]", unit = "rpm" }
torque = { header = "torque [µN.m]", unit = "µN.m" }

[[layouts]]
name = "blocks"                           # one block a recording: lines "key: value", a header row, readings
shape = "blocks"
files = ["*.txt"]
separator = ","
decimal_sign = "."
time_format = "yyyy-MM-ddTHH:mm:sszzz"
block_start = "Sample"                    # the key whose line starts a block
key_separator = ":"                       # default :
up_words = ["up"]
down_words = ["down"]

[layouts.keys]
sample = { header = "Sample" }
person = { header = "Person" }
visit = { header = "Visit" }
loading = { header = "Loading" }
instrument = { header = "Instrument" }
geometry = { header = "Geometry" }
fluid = { header = "Fluid" }              # filled in checks
started_at = { header = "Start" }
reading_count = { header = "Readings" }

[layouts.columns]
ramp = { header = "Ramp" }
temperature = { header = "Temperature [°C]", unit = "°C" }
set_shear_rate = { header = "Rate asked [1/s]", unit = "1/s" }
shear_rate = { header = "Rate [1/s]", unit = "1/s" }
shear_stress = { header = "Stress [mPa]", unit = "mPa" }

[[instruments]]
name = "R1"
torque_floor = "0.1 µN.m"                 # readings below it are set aside; a blank run may raise it
torque_zero = "0.005 µN.m"                # standard uncertainty of the day's torque zero, where no blank run of the day tells it
# correct_torque_zero = true              # take the zero of the blank run from every torque; left out, its size is part of the uncertainty
# torque_resolution = "0.01 µN.m"         # step in which torques are given; joins the floor of [errors] by each curve's geometry
thermometer = "0.1 K"                     # standard uncertainty
check_every = "8 d"                       # how long a passed check vouches for the instrument
check_limit = "3 %"                       # largest error a check may show
# check_scatter = "1 %"                   # scatter of one check; declare it while a period has one check only: without it no value is corrected
# adjusted = [2026-03-02T09:00:00+01:00]  # adjusted or repaired: each starts a new period

[[geometries]]                            # concentric cylinders
name = "CYL-1"
inner_radius = "12.5 mm"
outer_radius = "13.56 mm"
length = "37.5 mm"
end_factor = 1.10                         # 1.10 for the standard shape of ISO 3219
# turning = "inner"                       # or "outer"; left out: laminar flow is judged as if the inner one turned

[[fluids]]
name = "oil-5"
kind = "certified"
lot = "lot of the certificate"
viscosity = "4.85 mPa.s"
at = "37 °C"
expanded_uncertainty = "0.4 %"
coverage_factor = 2                       # as the certificate states it
per_kelvin = "2.2 %/K"
per_kelvin_uncertainty = "0.03 %/K"
# density = "849 kg/m3"                   # laminar flow is judged by it; known for water and glycerol-water
# bath = "37 °C"                          # what the bath is set to; a check that reads another temperature is marked
# certificate = "oil-5.toml"              # a certificate file instead of all keys from lot to per_kelvin_uncertainty
#
# Such a file has several temperatures, and viscosity is interpolated between the lowest and the highest, never beyond:
#   name = "viscosity oil 5"
#   lot = "24-117"
#   issued = 2026-01-15
#   valid_until = 2027-01-14
#   coverage_factor = 2
#   interpolation = "VFT"                 # Vogel-Fulcher-Tammann, three temperatures or more; or "ASTM D341", two or more, each with density
#   [[rows]]                              # one a temperature
#   temperature = "20 °C"
#   viscosity = "8.60 mPa.s"              # or kinematic_viscosity = "10.0 mm2/s" with density
#   density = "860 kg/m3"
#   expanded_uncertainty = "0.4 %"
#
# A mixture of glycerol and water (kind = "glycerol-water") is known to 3 %, sucrose in water (kind = "sucrose-40") to 5 %; they need a lot and, the mixture:
# mass_fraction = "50 %"                  # of glycerol
# mass_fraction_uncertainty = "0.1 %"     # standard uncertainty of mixing

[[fluids]]
name = "water"
kind = "water"                            # viscosity from IAPWS SR6-08
lot = "how it was made pure"
expanded_uncertainty = "1 %"
coverage_factor = 2

[[counters]]                              # of hematocrit
name = "centrifuge"
uncertainty = "0.006 L/L"                 # of one sample, without the shared part
shared_uncertainty = "0.003 L/L"          # of the bias all its samples share

[blood]
per_kelvin = "2.6 %/K"                    # fall of viscosity per kelvin
per_kelvin_uncertainty = "0.4 %/K"
plasma_per_kelvin = "2.0 %/K"
plasma_uncertainty = "1 %"                # of one plasma viscosity

[errors]                                  # of one reading: (relative stress)^2 + floor^2
relative = "1 %"
floor = "0.3 mPa"
known = true                              # false: known up to a factor that each fit estimates
loading = "2 %"                           # between loadings; used when no sample is loaded twice
# point_correlation = 0.3                 # of neighboring readings of a ramp, 0: none; left out, it is estimated

[screening]                               # every key may be left out; these are the defaults
temperature = "37 °C"
temperature_tolerance = "0.5 K"
speed_tolerance = "5 %"
longest_since_draw = "4 h"
duplicate_tolerance = "0.1 %"
lowest_hematocrit = "0.20 L/L"
highest_hematocrit = "0.70 L/L"

[analysis]
laws = ["Newtonian", "Casson", "Quemada"]
decide_by = "Quemada"                     # the law whose values are decided on
standard_rates = ["1 1/s", "10 1/s", "100 1/s"]
ramp = "down"                             # default down; the other ramp serves hysteresis
correct_bias = true                       # default true: by the mean of the period's checks
level = 0.95                              # default 0.95: probability that decides a verdict

[standard_hematocrit]
hematocrit = "0.45 L/L"
decide_by = "plasma-power"                # or "study-slope"

[reference]
from_controls = true                      # from the control group where it is large enough

# [[reference.declared]]                  # limits with their source, where the controls are too few
# rate = "100 1/s"
# at_standard_hematocrit = true
# lower = "3.9 mPa.s"
# upper = "5.3 mPa.s"
# source = "where they come from"

[[groups]]
code = "A"
label = "controls"
controls = true

[[groups]]
code = "B"
label = "patients"
controls = false

""";
}
