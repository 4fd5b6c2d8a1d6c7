using System.Diagnostics;
using Microsoft.AspNetCore.Html;
using Microsoft.DotNet.Interactive;
using Microsoft.DotNet.Interactive.Formatting;

namespace HemoRheo.Notebooks;

/// <summary>A progress bar in the output of the running cell: at most five changes a second, and one line when it ends.</summary>
internal sealed class CellProgress : IProgress<AnalysisProgress>, IDisposable
{
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(200);

    private readonly Lock _gate = new();
    private readonly DisplayedValue _shown;
    private long _last = Stopwatch.GetTimestamp();
    private bool _ended;

    public CellProgress(KernelInvocationContext context)
    {
        _shown = context.Display(Html(Markup.Of($"<progress></progress> starting")), "text/html");
    }

    /// <inheritdoc/>
    public void Report(AnalysisProgress value)
    {
        lock (_gate)
        {
            if (_ended || Stopwatch.GetElapsedTime(_last) < Pause) return;
            _last = Stopwatch.GetTimestamp();
            _shown.Update(Html(Markup.Of($"<progress value=\"{value.Done}\" max=\"{Math.Max(1, value.Of)}\"></progress> {value.Stage}: {value.Done} of {value.Of}")));
        }
    }

    /// <summary>Takes the bar away.</summary>
    public void Dispose()
    {
        lock (_gate)
        {
            if (_ended) return;
            _ended = true;
            _shown.Update(Html(Markup.None));
        }
    }

    private static HtmlString Html(Markup markup) => new(markup.Text);
}
