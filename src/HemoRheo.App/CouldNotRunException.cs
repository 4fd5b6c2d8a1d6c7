namespace HemoRheo.App;

/// <summary>Why the program cannot do what was asked, in words for the person who asked.</summary>
internal sealed class CouldNotRunException(string message) : Exception(message);
