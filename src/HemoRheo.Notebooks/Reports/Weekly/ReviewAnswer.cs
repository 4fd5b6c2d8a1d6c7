namespace HemoRheo.Notebooks;

/// <summary>One of the three answers about an instrument, in plain words.</summary>
/// <param name="Question">The question.</param>
/// <param name="Short">The answer in a word or two.</param>
/// <param name="Lines">What it rests on, one sentence or two a line.</param>
internal sealed record ReviewAnswer(string Question, string Short, Items<string> Lines);
