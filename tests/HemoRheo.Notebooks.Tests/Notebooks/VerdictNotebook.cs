namespace HemoRheo.Notebooks.Tests;

/// <summary>The notebook of the whole chain, executed once for all tests that look at it.</summary>
public sealed class VerdictNotebook : IDisposable
{
    private readonly Lazy<Jupyter> _jupyter = new(() => new());
    private readonly Lazy<ExecutedNotebook> _executed;
    private readonly Lazy<string> _drawn;

    public VerdictNotebook()
    {
        _executed = new(() => _jupyter.Value.Execute(Source));
        _drawn = new(() => _jupyter.Value.Drawn(_executed.Value));
    }

    internal static string Source { get; } = Path.Combine(Repository.Root, "notebooks", "01-from-export-to-verdict.ipynb");

    internal ExecutedNotebook Executed
    {
        get
        {
            Jupyter.Needed();
            return _executed.Value;
        }
    }

    /// <summary>Its page after a browser without a network has drawn it.</summary>
    internal string Drawn
    {
        get
        {
            Jupyter.Needed();
            Browser.Needed();
            return _drawn.Value;
        }
    }

    public void Dispose()
    {
        if (_jupyter.IsValueCreated) _jupyter.Value.Dispose();
    }
}
