namespace HemoRheo.Notebooks.Tests;

/// <summary>The notebook on fitting a law.</summary>
public sealed class FittingNotebook() : KeptNotebook("02-fit-a-law.ipynb", charts: 5);
