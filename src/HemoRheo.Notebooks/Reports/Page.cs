namespace HemoRheo.Notebooks;

/// <summary>The frame of every page: one file, no script, nothing from the network, readable on paper and in grey.</summary>
internal static class Page
{
    private const string Policy = "default-src 'none'; img-src data:; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'";

    /// <summary>A whole page.</summary>
    /// <param name="title">Its title.</param>
    /// <param name="trail">Where it stands, above the title: links up and sideways.</param>
    /// <param name="study">Name of the study.</param>
    /// <param name="body">What it says.</param>
    /// <param name="style">A style sheet of its own beside the common one.</param>
    public static string Write(string title, Markup trail, string study, Markup body, string style = "") => Markup.Of($"""
        <!DOCTYPE html>
        <html lang="en">
        <head>
        <meta charset="utf-8"/>
        <meta name="viewport" content="width=device-width, initial-scale=1"/>
        <meta http-equiv="Content-Security-Policy" content="{Policy}"/>
        <meta name="referrer" content="no-referrer"/>
        <title>{title} · {study}</title>
        <style>{new Markup(PageStyle.Css)}{new Markup(style)}</style>
        </head>
        <body>
        <header>
        <nav aria-label="Pages">{trail}</nav>
        <h1>{title}</h1>
        <p class="study">Study <b>{study}</b></p>
        <p class="caution" role="note"><b>Caution.</b> {ResearchUse.Caution}</p>
        </header>
        <main>
        {body}
        </main>
        <footer><p>{ResearchUse.Caution} Names are pseudonyms as the study gives them. Intervals are 95 % with the whole uncertainty budget unless a line says otherwise.</p></footer>
        </body>
        </html>

        """).Text;

    /// <summary>A section with its heading and an anchor.</summary>
    public static Markup Section(string anchor, string heading, Markup body) => Markup.Of($"""
        <section id="{anchor}" aria-labelledby="{anchor}-h">
        <h2 id="{anchor}-h">{heading}</h2>
        {body}
        </section>

        """);

    /// <summary>A still picture with its caption. It is an image with an address of its own, so it prints and survives wherever the page goes.</summary>
    /// <param name="svg">The picture.</param>
    /// <param name="alt">What it shows, for those who do not see it.</param>
    /// <param name="caption">Its caption.</param>
    public static Markup Figure(string svg, string alt, Markup caption) => Markup.Of($"""
        <figure><img alt="{alt}" width="{Still.Width}" src="data:image/svg+xml;base64,{Convert.ToBase64String(System.Text.Encoding.UTF8.GetBytes(svg))}"/><figcaption>{caption}</figcaption></figure>

        """);
}
