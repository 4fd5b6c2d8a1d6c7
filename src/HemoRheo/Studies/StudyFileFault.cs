namespace HemoRheo;

/// <summary>One thing wrong with a study file.</summary>
/// <param name="File">Name of the study file.</param>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column of the character, from 1.</param>
/// <param name="Found">What was found there.</param>
/// <param name="Expected">What was expected.</param>
/// <param name="WhatToDo">What a person should do.</param>
public sealed record StudyFileFault(string File, int Line, int Column, string Found, string Expected, string WhatToDo)
{
    /// <inheritdoc/>
    public override string ToString() => $"{File}:{Line}:{Column}: found {Found}; expected {Expected}; {WhatToDo}";
}
