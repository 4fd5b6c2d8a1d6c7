using System.Globalization;

namespace HemoRheo;

/// <summary>The numbers of a user's own law, by the names of its parameters.</summary>
/// <param name="Parameters">The parameters.</param>
/// <param name="Numbers">Their numbers on the natural scale, SI, in the same order.</param>
public sealed record NamedValues(Items<LawParameter> Parameters, Items<double> Numbers)
{
    /// <summary>The number of a parameter, SI.</summary>
    /// <param name="name">Its name.</param>
    /// <exception cref="ArgumentException">There is no parameter of this name; the message lists those there are.</exception>
    public double this[string name]
    {
        get
        {
            for (var k = 0; k < Parameters.Count; k++)
            {
                if (Parameters[k].Name == name) return Numbers[k];
            }

            throw new ArgumentException($"There is no parameter named '{name}'; the parameters are {string.Join(", ", Parameters.Select(parameter => parameter.Name))}.", nameof(name));
        }
    }

    /// <inheritdoc/>
    public override string ToString() => string.Join(", ", Parameters.Zip(Numbers, (parameter, number) => string.Create(CultureInfo.InvariantCulture, $"{parameter.Name} {number:G4} {parameter.Unit}")));
}
