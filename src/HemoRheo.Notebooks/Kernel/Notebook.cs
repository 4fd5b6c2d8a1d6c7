using System.Reflection;
using HemoRheo.Notebooks;

namespace HemoRheo;

/// <summary>Makes a notebook show this library's results. The package calls it when <c>#r "nuget:HemoRheo.Notebooks"</c> loads it.</summary>
public static class Notebook
{
    /// <summary>Repairs what the kernel lacks, registers how results are shown, shows the chart library once, and says one line.</summary>
    /// <param name="fsharpCore">The FSharp.Core that the cells of the notebook use, 10.1 or newer.</param>
    /// <exception cref="InvalidOperationException">That FSharp.Core is too old, or this is no cell of a notebook.</exception>
    public static void Start(Assembly fsharpCore)
    {
        FSharpBinding.Repair(fsharpCore);
        KernelSession.Begin();
    }
}
