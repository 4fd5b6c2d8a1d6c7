namespace HemoRheo.Notebooks;

/// <summary>What makes the weekly page one side of A4.</summary>
internal static class WeeklyStyle
{
    /// <summary>The style sheet beside that of all pages; the page looks on the screen as on paper.</summary>
    public const string Css = """
        @page{size:A4 portrait;margin:10mm 12mm}
        body{max-width:186mm;padding:0;margin:6mm auto;font-size:8.3pt;line-height:1.3}
        h1{font-size:14pt;margin:0}
        h2{font-size:9.5pt;margin:1.6mm 0 .5mm;padding-top:.7mm;border-top-width:1px}
        p{margin:.6mm 0;max-width:none}
        .caution{padding:.6mm 2mm;margin:1mm 0;font-size:7.2pt}
        .answers{grid-template-columns:1fr 1.35fr .8fr;gap:2.5mm;margin:1.5mm 0}
        .answers>div{padding:1mm 2mm;border-top-width:2px}
        .answers h3{font-size:8pt;margin:0;color:var(--quiet)}
        .answers .short{font-size:12pt;font-weight:700;margin:.3mm 0}
        .answers p{font-size:8pt}
        figure{margin:.5mm 0}
        figure img{width:100%;border:none}
        figcaption{font-size:7.2pt;max-width:none;margin:0}
        .wide{margin:.5mm 0;overflow:visible}
        table{font-size:7.2pt;line-height:1.2;width:100%}
        th,td{padding:.35mm 2mm .35mm 0}
        ul.tasks{margin:0;padding:0;list-style:none}
        ul.tasks li{display:grid;grid-template-columns:43mm 1fr;margin:.4mm 0}
        thead .n{white-space:normal}
        tbody th{white-space:nowrap}
        caption{position:absolute;clip-path:inset(50%);white-space:nowrap}
        .digest{font-size:7.5pt;overflow-wrap:anywhere}
        footer{display:none}
        @media print{body{margin:0;font-size:8.3pt}table{font-size:7.2pt}th,td{padding-right:2mm}}
        @media screen and (max-width:45rem){body{margin:1rem}.answers{grid-template-columns:1fr}}

        """;
}
