using System.Text;

namespace HemoRheo.App.Synthetic;

/// <summary>Writes recordings as one row a reading: semicolons, decimal comma, only speed and torque.</summary>
internal static class RowsExport
{
    public const string Header = "Sample;Filling;Rheometer;Cup;Ramp;Started;Elapsed s;Temp °C;Set speed 1/min;Speed 1/min;Torque µN·m";

    public static string Of(IEnumerable<SimulatedRecording> recordings)
    {
        var text = new StringBuilder(Header).Append('\n');
        foreach (var recording in recordings)
        {
            foreach (var reading in recording.Readings)
            {
                text.AppendJoin(
                    ';',
                    recording.Sample,
                    Written.Whole(recording.Loading),
                    CohortPlan.Instrument,
                    CohortPlan.Geometry,
                    reading.Up ? "up" : "down",
                    Written.Moment(recording.StartedAt),
                    Written.Whole(reading.Elapsed),
                    Written.Comma(reading.Temperature, 2),
                    Written.Comma(reading.SetTurnsPerMinute, 4),
                    Written.Comma(reading.ReachedTurnsPerMinute, 4),
                    Written.Comma(1e6 * reading.Torque, 4)).Append('\n');
            }
        }
        return text.ToString();
    }
}
