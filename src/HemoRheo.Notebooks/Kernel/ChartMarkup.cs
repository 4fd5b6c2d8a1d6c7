using System.Text;
using Plotly.NET;

namespace HemoRheo.Notebooks;

/// <summary>A chart as HTML: a still picture that a script replaces by the interactive figure, as soon as the chart library is there.</summary>
internal static class ChartMarkup
{
    public static Markup Of(InteractiveChart chart)
    {
        var still = Markup.Of($"<img width=\"{Still.Width}\" alt=\"{chart.Title}\" src=\"data:image/svg+xml;base64,{Convert.ToBase64String(Encoding.UTF8.GetBytes(chart.StillPicture))}\"/>");
        return Of(chart.Figure, still);
    }

    public static Markup Of(GenericChart figure) => Of(figure, Markup.Of($"<p>An interactive chart stands here once this cell is run.</p>"));

    private static Markup Of(GenericChart figure, Markup still)
    {
        var id = $"hr{Guid.NewGuid().ToString("N")[..12]}";
        var json = GenericChart.toFigureJson(figure).Replace("<", "\\u003c", StringComparison.Ordinal);
        var script = new Markup($$"""
            <script>(function(){var f={{json}};
            var draw=function(){var d=document.getElementById('{{id}}');if(d){d.innerHTML='';Plotly.newPlot(d,f.data,f.layout,{displaylogo:false,modeBarButtonsToRemove:["select2d","lasso2d","autoScale2d"]});} };
            if(window.Plotly)draw();else(window.hrPlots=window.hrPlots||[]).push(draw);})();</script>
            """);
        return Markup.Of($"<div id=\"{id}\">{still}</div>{script}");
    }
}
