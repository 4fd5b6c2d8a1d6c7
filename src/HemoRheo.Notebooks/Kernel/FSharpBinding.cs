using System.Reflection;
using System.Runtime.Loader;

namespace HemoRheo.Notebooks;

/// <summary>
/// The Jupyter kernel carries an older FSharp.Core than the chart and frame packages ask for. This answers their request with the one the cells use,
/// and loads the one package that names a still older FSharp.Core with its reference moved. It does nothing in a kernel that needs no repair.
/// </summary>
/// <remarks>No member of this class may mention an F# type.</remarks>
internal static class FSharpBinding
{
    private const string Core = "FSharp.Core";
    private static readonly Version Needed = new(10, 1, 0, 0);

    public static void Repair(Assembly core)
    {
        var version = core.GetName().Version ?? new Version();
        if (version < Needed)
        {
            throw new InvalidOperationException($"This notebook's cells use FSharp.Core {version}, and charts and frames need {Needed} or newer. Put the line #r \"nuget:HemoRheo.Notebooks\" before any other #r line and restart the kernel.");
        }

        if (CarriedByKernel() is not { } carried || carried >= Needed) return;
        AppDomain.CurrentDomain.AssemblyResolve += (_, asked) => new AssemblyName(asked.Name).Name == Core ? core : null;
        var image = File.ReadAllBytes(ViewEngineBeside(core));
        AssemblyReferences.Move(image, Core, Needed);
        AssemblyLoadContext.Default.LoadFromStream(new MemoryStream(image));
    }

    private static Version? CarriedByKernel()
    {
        var trusted = (AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES") as string ?? "").Split(Path.PathSeparator);
        var file = trusted.FirstOrDefault(path => Path.GetFileName(path) == $"{Core}.dll");
        return file is null ? null : AssemblyName.GetAssemblyName(file).Version;
    }

    /// <summary>The newest Giraffe.ViewEngine of the packages folder that holds this FSharp.Core: packages/fsharp.core/version/lib/framework/FSharp.Core.dll.</summary>
    private static string ViewEngineBeside(Assembly core)
    {
        var packages = new FileInfo(core.Location).Directory?.Parent?.Parent?.Parent?.Parent
            ?? throw new InvalidOperationException($"FSharp.Core was not loaded from a packages folder but from \"{Path.GetFileName(core.Location)}\"; charts cannot be shown. Restart the kernel and load only HemoRheo.Notebooks.");
        var versions = packages.GetDirectories("giraffe.viewengine").SelectMany(package => package.GetDirectories());
        return versions.OrderByDescending(version => version.Name, StringComparer.Ordinal)
            .Select(version => Path.Combine(version.FullName, "lib", "netstandard2.0", "Giraffe.ViewEngine.dll"))
            .FirstOrDefault(File.Exists)
            ?? throw new InvalidOperationException("The package Giraffe.ViewEngine, which charts need, does not lie beside FSharp.Core in the packages folder. Restart the kernel and load HemoRheo.Notebooks again.");
    }
}
