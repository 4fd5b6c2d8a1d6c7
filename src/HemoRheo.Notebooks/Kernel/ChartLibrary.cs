using System.IO.Compression;

namespace HemoRheo.Notebooks;

/// <summary>The script that draws charts, shown once in a notebook so that charts need no network: plotly.js as Plotly.NET carries it, packed.</summary>
internal static class ChartLibrary
{
    /// <summary>An HTML script element that unpacks the library and then draws every chart that waits for it.</summary>
    /// <remarks>The page may have a module loader; hiding its names makes the library give itself to the window instead.</remarks>
    public static string Script() => $$"""
        <script>(function(){
        var draw=function(){(window.hrPlots||[]).splice(0).forEach(function(f){f();});};
        if(window.Plotly){draw();return;}
        if(window.hrLibrary)return;
        window.hrLibrary=true;
        var bytes=Uint8Array.from(atob('{{Packed()}}'),function(c){return c.charCodeAt(0);});
        new Response(new Blob([bytes]).stream().pipeThrough(new DecompressionStream('gzip'))).text().then(function(text){
        var s=document.createElement('script');
        s.textContent='(function(){var define,module,exports;'+text+'}).call(window);';
        document.head.appendChild(s);draw();});
        })();</script>
        """;

    private static string Packed()
    {
        var assembly = typeof(Plotly.NET.GenericChart).Assembly;
        var name = assembly.GetManifestResourceNames().Single(name => name.EndsWith(".min.js", StringComparison.Ordinal));
        using var source = assembly.GetManifestResourceStream(name)!;
        using var packed = new MemoryStream();
        using (var gzip = new GZipStream(packed, CompressionLevel.SmallestSize, leaveOpen: true)) source.CopyTo(gzip);
        return Convert.ToBase64String(packed.GetBuffer().AsSpan(0, (int)packed.Length));
    }
}
