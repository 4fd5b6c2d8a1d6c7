namespace HemoRheo.Notebooks;

/// <summary>The look of the pages: the reader's own fonts, one accent color, nothing that needs color to be understood.</summary>
internal static class PageStyle
{
    /// <summary>The style sheet.</summary>
    public const string Css = """

        :root{--text:#22262b;--quiet:#565e66;--line:#cfd5da;--accent:#0f5c7a;--ground:#f4f6f7;--alert:#9a3f00}
        *{box-sizing:border-box}
        html{-webkit-text-size-adjust:100%}
        body{margin:0 auto;max-width:78rem;padding:1.2rem 1.4rem 3rem;font:16px/1.5 system-ui,sans-serif;color:var(--text);background:#fff}
        h1{font-size:1.75rem;line-height:1.2;margin:.3rem 0 .1rem}
        h2{font-size:1.25rem;margin:2.4rem 0 .6rem;padding-top:.7rem;border-top:2px solid var(--accent)}
        h3{font-size:1.05rem;margin:1.5rem 0 .4rem}
        p{margin:.5rem 0;max-width:48rem}
        a{color:var(--accent);text-underline-offset:2px}
        nav{font-size:.9rem}
        nav ul{list-style:none;margin:0;padding:0;display:flex;flex-wrap:wrap;gap:.2rem 1.1rem}
        .study{margin:0;color:var(--quiet)}
        .caution{border-left:4px solid var(--alert);padding:.45rem .8rem;background:var(--ground);max-width:none}
        .lead{font-size:1.05rem}
        .quiet,footer{color:var(--quiet);font-size:.9rem}
        footer{margin-top:3rem;border-top:1px solid var(--line)}
        .wide{overflow-x:auto;margin:.6rem 0 1rem}
        table{border-collapse:collapse;font-size:.875rem;line-height:1.35;font-variant-numeric:tabular-nums}
        caption{text-align:left;font-weight:600;padding:.2rem 0 .4rem;max-width:48rem}
        th,td{text-align:left;vertical-align:top;padding:.28rem .9rem .28rem 0;border-bottom:1px solid var(--line)}
        thead th{vertical-align:bottom;border-bottom:2px solid var(--text);font-weight:600}
        tbody th{font-weight:600}
        .samples td:nth-child(2){min-width:11rem}
        table code{white-space:nowrap}
        tfoot th,tfoot td{border-top:2px solid var(--text);border-bottom:none;font-weight:600}
        .n{text-align:right;white-space:nowrap}
        .w{white-space:nowrap}
        td small,th small{color:var(--quiet);font-weight:400;font-size:.92em}
        .loud{font-weight:700}
        .loud::before{content:"\25B8\00A0";color:var(--alert)}
        figure{margin:1rem 0}
        figure img{max-width:100%;height:auto;display:block;border:1px solid var(--line)}
        figcaption{font-size:.9rem;color:var(--quiet);max-width:44rem;margin-top:.3rem}
        dl{display:grid;grid-template-columns:max-content 1fr;gap:.2rem 1.2rem;margin:.6rem 0;font-size:.925rem}
        dt{color:var(--quiet)}
        dd{margin:0;overflow-wrap:anywhere}
        ol.look>li,ul.look>li{margin:.35rem 0;max-width:48rem}
        ol.chain{list-style:none;padding:0;margin:.6rem 0}
        ol.chain>li{border-left:3px solid var(--accent);padding:.1rem 0 .6rem 1rem;max-width:50rem}
        ol.chain>li b{display:inline-block;min-width:6.5rem}
        code{font-family:ui-monospace,monospace;font-size:.9em;overflow-wrap:anywhere}
        .answers{display:grid;grid-template-columns:repeat(auto-fit,minmax(15rem,1fr));gap:1rem;margin:.8rem 0}
        .answers>div{border-top:3px solid var(--accent);background:var(--ground);padding:.6rem .9rem}
        .answers h3{margin:.1rem 0 .3rem;font-size:.95rem}
        .answers p{margin:.2rem 0}
        @media (max-width:40rem){dl{grid-template-columns:1fr}dd{margin-bottom:.4rem}}
        @media print{body{max-width:none;padding:0;font-size:10pt}a{color:inherit;text-decoration:none}nav{display:none}
        h2{break-after:avoid}tr,figure,.answers>div{break-inside:avoid}thead{display:table-header-group}.wide{overflow:visible}table{font-size:8pt}th,td{padding-right:.5rem}}

        """;
}
