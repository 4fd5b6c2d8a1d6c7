namespace HemoRheo.Notebooks.Tests;

/// <summary>A notebook executed once, and drawn once, for all tests that look at it.</summary>
public abstract class HeadlessNotebook : IDisposable
{
    private readonly Lazy<Jupyter> _jupyter = new(() => new());
    private readonly Lazy<ExecutedNotebook> _executed;
    private readonly Lazy<string> _drawn;

    private protected HeadlessNotebook(Func<Jupyter, ExecutedNotebook> execute)
    {
        _executed = new(() => execute(_jupyter.Value));
        _drawn = new(() => _jupyter.Value.Drawn(_executed.Value));
    }

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

    /// <summary>Ends what executed it.</summary>
    public void Dispose()
    {
        if (_jupyter.IsValueCreated) _jupyter.Value.Dispose();
        GC.SuppressFinalize(this);
    }
}
