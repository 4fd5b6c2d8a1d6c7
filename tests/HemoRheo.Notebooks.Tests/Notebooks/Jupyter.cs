using System.Diagnostics;
using System.Reflection;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace HemoRheo.Notebooks.Tests;

/// <summary>Runs notebooks without a browser: the system's Jupyter, the kernel from the packages folder, the packages of this build, and no network.</summary>
internal sealed class Jupyter : IDisposable
{
    private const string KernelVersion = "1.0.712001";
    private static readonly string Python = Environment.GetEnvironmentVariable("HEMORHEO_PYTHON") ?? "/usr/bin/python3";
    private static readonly Lazy<bool> Found = new(() => File.Exists(Python) && Run(Python, ["-c", "import nbconvert, jupyter_client"], null, []).ExitCode == 0);

    private readonly string _folder = Directory.CreateTempSubdirectory("hemorheo-jupyter-").FullName;

    public Jupyter()
    {
        Folder = Directory.CreateDirectory(Path.Combine(_folder, "notebooks")).FullName;
        File.WriteAllText(Path.Combine(Folder, "nuget.config"), $"""
            <configuration><packageSources><clear /><add key="build" value="{Path.Combine(Repository.Root, "artifacts", "feed")}" /></packageSources></configuration>
            """);
        WriteKernel();
        LinkPackages();
    }

    /// <summary>Folder for a test's own files; it has the feed of this build as its only package source.</summary>
    public string Folder { get; }

    private static string Packages => typeof(Jupyter).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(one => one.Key == "PackagesFolder").Value!;

    /// <summary>Skips the test where there is no Jupyter.</summary>
    public static void Needed() => Assert.SkipUnless(Found.Value, "not run: needs Jupyter, see DEVELOPERS.md");

    /// <summary>A notebook of these cells, executed.</summary>
    public ExecutedNotebook Execute(string name, params string[] cells)
    {
        var path = Path.Combine(Folder, $"{name}.ipynb");
        File.WriteAllText(path, NewNotebook(cells).ToJsonString());
        return Execute(path);
    }

    /// <summary>A notebook, executed where it lies; it is not changed. Jupyter chooses ports before the kernel takes them, and another program may be quicker: then once more.</summary>
    public ExecutedNotebook Execute(string path)
    {
        var output = Directory.CreateDirectory(Path.Combine(_folder, "executed")).FullName;
        var (exitCode, log) = Convert();
        if (log.Contains("DeadKernelError", StringComparison.Ordinal)) (exitCode, log) = Convert();
        Assert.True(exitCode == 0, log);
        return new(Path.Combine(output, Path.GetFileName(path)));

        (int ExitCode, string Log) Convert() => RunPython("-m", "nbconvert", "--to", "notebook", "--execute", "--allow-errors", "--ExecutePreprocessor.kernel_name=hemorheo-test", "--ExecutePreprocessor.timeout=300", path, "--output-dir", output);
    }

    /// <summary>The notebook as an HTML page, drawn by a browser that has no network.</summary>
    public string Drawn(ExecutedNotebook notebook)
    {
        var (exitCode, log) = RunPython("-m", "nbconvert", "--to", "html", notebook.Path, "--output-dir", _folder);
        Assert.True(exitCode == 0, log);
        return Browser.Drawn(Path.Combine(_folder, Path.ChangeExtension(Path.GetFileName(notebook.Path), ".html")), Path.Combine(_folder, "browser"));
    }

    /// <summary>Python with Jupyter's folders set to the test's own and no network.</summary>
    public (int ExitCode, string Log) RunPython(params string[] arguments) => Run(Python, arguments, Folder, new()
    {
        ["JUPYTER_PATH"] = Path.Combine(_folder, "jupyter"),
        ["JUPYTER_DATA_DIR"] = Path.Combine(_folder, "jupyter"),
        ["JUPYTER_CONFIG_DIR"] = Path.Combine(_folder, "config"),
        ["JUPYTER_RUNTIME_DIR"] = Path.Combine(_folder, "runtime"),
        ["NUGET_PACKAGES"] = Path.Combine(_folder, "packages"),
        ["DOTNET_CLI_TELEMETRY_OPTOUT"] = "1",
        ["http_proxy"] = "http://127.0.0.1:9",
        ["https_proxy"] = "http://127.0.0.1:9",
        ["no_proxy"] = "127.0.0.1,localhost",
    });

    public void Dispose()
    {
        foreach (var link in Directory.GetDirectories(Path.Combine(_folder, "packages")).Where(path => new DirectoryInfo(path).LinkTarget is not null)) Directory.Delete(link);
        Directory.Delete(_folder, true);
    }

    private static (int ExitCode, string Log) Run(string program, string[] arguments, string? folder, Dictionary<string, string> environment)
    {
        var start = new ProcessStartInfo(program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = folder ?? "" };
        foreach (var (name, value) in environment) start.Environment[name] = value;
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output + error.Result);
    }

    private static JsonObject NewNotebook(string[] cells) => new()
    {
        ["nbformat"] = 4,
        ["nbformat_minor"] = 5,
        ["metadata"] = new JsonObject { ["kernelspec"] = new JsonObject { ["name"] = "hemorheo-test", ["display_name"] = "C#", ["language"] = "C#" } },
        ["cells"] = new JsonArray([.. cells.Select((cell, i) => new JsonObject
        {
            ["id"] = $"cell-{i}",
            ["cell_type"] = "code",
            ["metadata"] = new JsonObject(),
            ["execution_count"] = null,
            ["outputs"] = new JsonArray(),
            ["source"] = cell,
        })]),
    };

    private void WriteKernel()
    {
        var app = Path.Combine(Packages, "microsoft.dotnet-interactive", KernelVersion, "tools", "net10.0", "any", "Microsoft.DotNet.Interactive.App.dll");
        var folder = Directory.CreateDirectory(Path.Combine(_folder, "jupyter", "kernels", "hemorheo-test")).FullName;
        File.WriteAllText(Path.Combine(folder, "kernel.json"), JsonSerializer.Serialize(new
        {
            argv = new[] { "dotnet", "exec", app, "jupyter", "--default-kernel", "csharp", "{connection_file}", "--http-local-only" },
            display_name = "C#",
            language = "C#",
        }));
    }

    /// <summary>A packages folder with all the packages but the two of this repository, so that they come from the feed of this build and leave the user's folder alone.</summary>
    private void LinkPackages()
    {
        var own = Directory.CreateDirectory(Path.Combine(_folder, "packages")).FullName;
        foreach (var package in Directory.GetDirectories(Packages).Select(path => new DirectoryInfo(path)))
        {
            if (package.Name is not ("hemorheo" or "hemorheo.notebooks")) Directory.CreateSymbolicLink(Path.Combine(own, package.Name), package.FullName);
        }
    }
}
