namespace HemoRheo;

/// <summary>The least sum of squares with a function of the parameters held at a value.</summary>
/// <param name="value">The held value, on the working scale.</param>
/// <param name="scaled">The parameters, on the fitting scale.</param>
/// <param name="sum">The sum of squares.</param>
/// <param name="slope">Change of the least sum a change of the held value.</param>
internal sealed class ConstrainedMinimum(double value, double[] scaled, double sum, double slope)
{
    public double Value => value;

    public double[] Scaled => scaled;

    public double Sum => sum;

    public double Slope => slope;
}
