using System.Collections;
using System.Reflection;
using System.Runtime.InteropServices;
using Microsoft.DotNet.Interactive;
using Microsoft.DotNet.Interactive.Commands;

namespace HemoRheo.Notebooks;

/// <summary>
/// The Interrupt button of a notebook sends SIGINT, on which the kernel's web host ends the process. This takes the host's registrations out
/// and has SIGINT cancel the running cell, whose cancellation token then fires.
/// </summary>
internal static class Interrupt
{
    private static PosixSignalRegistration? _registration;

    /// <summary>Whether SIGINT cancels the cell; if not, it restarts the kernel as before.</summary>
    public static bool Cured => _registration is not null;

    public static void CancelsTheCell(Kernel root)
    {
        if (OperatingSystem.IsWindows() || Cured || !HostLetsGo()) return;
        _registration = PosixSignalRegistration.Create(PosixSignal.SIGINT, signal =>
        {
            signal.Cancel = true;
            _ = root.SendAsync(new Cancel());
        });
    }

    /// <summary>Leans on a private field of the runtime. Where it is not as expected nothing is changed, and an interrupt restarts the kernel as before.</summary>
    private static bool HostLetsGo()
    {
        const int NativeSigint = 2;
        var field = typeof(PosixSignalRegistration).GetField("s_registrations", BindingFlags.NonPublic | BindingFlags.Static);
        if (field?.GetValue(null) is not IDictionary all) return false;
        lock (all)
        {
            foreach (var signal in all.Keys)
            {
                if (signal is NativeSigint && all[signal] is IList registrations) registrations.Clear();
            }
        }

        return true;
    }
}
