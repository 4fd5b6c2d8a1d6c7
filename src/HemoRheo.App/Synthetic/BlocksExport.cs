using System.Text;

namespace HemoRheo.App.Synthetic;

/// <summary>Writes recordings as one block each: lines of key and value, then the readings with rate and stress and a decimal point.</summary>
internal static class BlocksExport
{
    public static string Of(IEnumerable<SimulatedRecording> recordings)
    {
        var text = new StringBuilder();
        foreach (var recording in recordings)
        {
            text.Append("Measurement: ").Append(recording.Sample).Append('\n');
            text.Append("Filling: ").Append(Written.Whole(recording.Loading)).Append('\n');
            text.Append("Instrument: ").Append(CohortPlan.Instrument).Append('\n');
            text.Append("Geometry: ").Append(CohortPlan.Geometry).Append('\n');
            if (recording.Fluid is not null) text.Append("Fluid: ").Append(recording.Fluid).Append('\n');
            text.Append("Started: ").Append(Written.Moment(recording.StartedAt)).Append('\n');
            text.Append("Readings: ").Append(Written.Whole(recording.Readings.Count)).Append("\n\n");
            text.Append("Ramp,Elapsed [s],Temperature [°C],Set rate [1/s],Rate [1/s],Stress [mPa]\n");
            foreach (var reading in recording.Readings)
            {
                text.AppendJoin(
                    ',',
                    reading.Up ? "up" : "down",
                    Written.Whole(reading.Elapsed),
                    Written.Point(reading.Temperature, 2),
                    Written.Point(reading.SetRate, 1),
                    Written.Point(reading.Rate, 4),
                    Written.Point(1000 * reading.Stress, 3)).Append('\n');
            }
            text.Append('\n');
        }
        return text.ToString();
    }
}
