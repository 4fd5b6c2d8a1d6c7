namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed class InterruptTests
{
    /// <summary>Starts the kernel as a notebook does, loads the package, runs a long cell, interrupts it, and runs another cell.</summary>
    private const string Session = """
        import sys, time
        from jupyter_client.manager import start_new_kernel
        manager, client = start_new_kernel(kernel_name="hemorheo-test", startup_timeout=120)
        said = []
        def hook(message):
            content = message["content"]
            if message["msg_type"] == "stream": said.append(content["text"])
            if message["msg_type"] in ("display_data", "update_display_data", "execute_result"): said.append(content["data"].get("text/plain", "") + content["data"].get("text/html", "")[:200])
            if message["msg_type"] == "error": said.append(content["evalue"])
        def run(code, timeout=180): return client.execute_interactive(code, timeout=timeout, output_hook=hook)["content"]["status"]
        try:
            print("loaded:", run('#r "nuget:HemoRheo.Notebooks"'))
            cell = client.execute('var token = Microsoft.DotNet.Interactive.KernelInvocationContext.Current.CancellationToken; Console.WriteLine("running"); while (true) { token.ThrowIfCancellationRequested(); await Task.Delay(20); }')
            while True:
                message = client.get_iopub_msg(timeout=120)
                if message["msg_type"] == "stream" and "running" in message["content"]["text"]: break
            asked = time.time()
            manager.interrupt_kernel()
            while True:
                reply = client.get_shell_msg(timeout=60)
                if reply["parent_header"].get("msg_id") == cell: break
            print("interrupted:", reply["content"]["status"], "within 10 s:", time.time() - asked < 10)
            print("alive:", manager.is_alive())
            said.clear()
            print("next:", run('Console.WriteLine(6 * 7);'), "".join(said).strip())
        finally:
            client.stop_channels(); manager.shutdown_kernel(now=True)
        """;

    [Fact]
    public void The_interrupt_button_cancels_the_cell_and_the_kernel_lives()
    {
        Jupyter.Needed();
        using var jupyter = new Jupyter();

        var (exitCode, log) = jupyter.RunPython("-c", Session);

        Assert.True(exitCode == 0, log);
        Assert.Contains("loaded: ok", log, StringComparison.Ordinal);
        Assert.Contains("interrupted: error within 10 s: True", log, StringComparison.Ordinal);
        Assert.Contains("alive: True", log, StringComparison.Ordinal);
        Assert.Contains("next: ok 42", log, StringComparison.Ordinal);
    }
}
