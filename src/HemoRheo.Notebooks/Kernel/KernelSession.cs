using System.Reflection;
using System.Runtime.CompilerServices;
using Microsoft.AspNetCore.Html;
using Microsoft.DotNet.Interactive;
using Microsoft.DotNet.Interactive.Commands;

namespace HemoRheo.Notebooks;

/// <summary>What happens once when the package is loaded into a kernel.</summary>
internal static class KernelSession
{
    /// <summary>Whether the package was loaded into a kernel. Until then no type of the kernel's packages may be touched: they are not there.</summary>
    public static bool Begun { get; private set; }

    [MethodImpl(MethodImplOptions.NoInlining)]
    public static void Begin()
    {
        var context = KernelInvocationContext.Current
            ?? throw new InvalidOperationException("Notebook.Start runs in a cell of a notebook. In a program, use the results and StudyPages instead.");
        var root = context.HandlingKernel.RootKernel;
        ResultFormats.Register();
        Interrupt.CancelsTheCell(root);
        if (root is CompositeKernel composite) composite.AddMiddleware(ShowLibraryAgain);
        context.Display(new HtmlString(ChartLibrary.Script()), "text/html");
        KernelInvocationContextExtensions.Display(context, Greeting(), "text/plain");
        Begun = true;
    }

    public static string Greeting() => $"HemoRheo {Version()}. For research use only: its values are not a diagnosis.";

    /// <summary>Running the <c>#r</c> cell again replaces its output and does not load the package again, so the chart library would be missing from the saved notebook.</summary>
    private static async Task ShowLibraryAgain(KernelCommand command, KernelInvocationContext context, KernelPipelineContinuation next)
    {
        if (command.GetType().Name == "AddPackage" && Names(command))
        {
            context.Display(new HtmlString(ChartLibrary.Script()), "text/html");
            KernelInvocationContextExtensions.Display(context, Greeting(), "text/plain");
        }

        await next(command, context);
    }

    private static bool Names(KernelCommand command) =>
        Microsoft.DotNet.Interactive.Connection.KernelCommandEnvelope.Serialize(command).Contains("HemoRheo.Notebooks", StringComparison.OrdinalIgnoreCase);

    private static string Version()
    {
        var full = typeof(KernelSession).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "";
        return full.Split('+')[0];
    }
}
