namespace HemoRheo.Notebooks;

/// <summary>The flow-behavior class of a curve with what it rests on.</summary>
internal static class BehaviorView
{
    public static Markup Of(FlowBehavior behavior) => Markup.Of($"""
        <p><b>{behavior.Verdict}</b></p>
        <ul>{behavior.Evidence.Select(sentence => Markup.Of($"<li>{sentence}</li>"))}</ul>

        """);
}
