namespace HemoRheo.Tests.Architecture;

public sealed class ArrowTests
{
    [Fact]
    public void Every_room_uses_only_the_rooms_it_may()
    {
        var allowed = Rooms.All.ToDictionary(room => room.Name, room => room.MayUse);
        var wrong = Sources.Files.SelectMany(tree => Arrows.In(tree, Sources.Compilation))
            .Where(mention => mention.Other is null || !allowed[mention.Room].Contains(mention.Other))
            .Select(mention => mention.ToString());
        Faults.None(wrong);
    }

    [Fact]
    public void The_table_allows_no_more_than_is_used()
    {
        var used = Sources.Files.SelectMany(tree => Arrows.In(tree, Sources.Compilation)).Select(mention => (mention.Room, mention.Other)).ToHashSet();
        Faults.None(Rooms.All.Skip(Rooms.Floor.Count).SelectMany(room => room.MayUse.Except(Rooms.Floor).Where(other => !used.Contains((room.Name, other))).Select(other => $"{room.Name} → {other}")));
    }

    [Fact]
    public void Every_folder_is_a_room_and_every_file_lies_in_one() => Faults.None(
        Sources.Files.Select(tree => Sources.RoomOf(tree)!).Distinct().Except(Rooms.All.Select(room => room.Name)));

    [Fact]
    public void No_arrow_leads_to_the_right_outside_the_floor()
    {
        var order = Rooms.All.Select(room => room.Name).ToList();
        var beyond = Rooms.All.Skip(Rooms.Floor.Count).SelectMany(room => room.MayUse.Where(other => order.IndexOf(other) >= order.IndexOf(room.Name)).Select(other => $"{room.Name} → {other}"));
        Faults.None(beyond);
    }

    [Theory]
    [InlineData("Numerics/Trespass.cs", "internal static class Trespass { static Unit? Unit; }", "Units")]
    [InlineData("FlowLaws/Trespass.cs", "internal static class Trespass { static object Curve() => FlowCurve.Of([], []); }", "Rheometry")]
    [InlineData("FlowLaws/Trespass.cs", "internal static class Trespass { static object? Length(Items<Citation> x) { foreach (var y in x) return y.Author; return null; } }", null)]
    [InlineData("Units/Trespass.cs", "internal static class Trespass { static object Words(SourceKind kind) => kind.Words(); }", "Uncertainty")]
    public void A_forbidden_mention_is_seen(string path, string declaration, string? other)
    {
        var compilation = Sources.With($"namespace HemoRheo;\n{declaration}", path);
        var mentions = Arrows.In(compilation.SyntaxTrees.Last(), compilation).Select(mention => mention.Other);
        if (other is null) Assert.DoesNotContain("Rheometry", mentions);
        else Assert.Contains(other, mentions);
    }

    [Fact]
    public void A_name_that_means_nothing_is_seen()
    {
        var compilation = Sources.With("namespace HemoRheo;\ninternal static class Trespass { static Nonsense? X; }", "Units/Trespass.cs");
        Assert.Contains(Arrows.In(compilation.SyntaxTrees.Last(), compilation), mention => mention.Other is null);
    }
}
