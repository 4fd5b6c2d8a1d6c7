namespace HemoRheo.Notebooks;

/// <summary>Curves fitted together.</summary>
internal static class JointFitView
{
    public static Markup Of(JointFit fit) => Markup.Of($"""
        {TableMarkup.Of(fit.ToTable(), $"{fit.Laws[0].Name}, {fit.Curves.Count} curves together; errors are those of the readings alone")}<p>It ended with {fit.Convergence.Message}. {Shared(fit)}Values may be taken from it: {(fit.Usable ? "yes" : "no")}.</p>
        {FindingsView.Folded(fit.Findings)}
        """);

    private static string Shared(JointFit fit) => fit.Compatibility is { } test ? $"Sharing is {(test.Contradicts ? "" : "not ")}contradicted: {test}. " : "";
}
