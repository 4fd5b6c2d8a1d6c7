namespace HemoRheo.Notebooks.Tests;

/// <summary>The notebook of the whole chain.</summary>
public sealed class VerdictNotebook() : KeptNotebook("01-from-export-to-verdict.ipynb", charts: 7);
