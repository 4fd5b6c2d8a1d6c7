namespace HemoRheo;

/// <summary>An instrument's log cannot be read or written. The message says why and what to do; nothing was half written.</summary>
public sealed class InstrumentLogException : Exception
{
    /// <summary>A log that cannot be used.</summary>
    /// <param name="message">Why, and what to do.</param>
    /// <param name="inner">The cause.</param>
    public InstrumentLogException(string message, Exception? inner = null)
        : base(message, inner)
    {
    }
}
