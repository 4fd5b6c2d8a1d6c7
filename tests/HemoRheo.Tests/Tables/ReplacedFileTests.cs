namespace HemoRheo.Tests.Tables;

public sealed class ReplacedFileTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("hemorheo-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_file_is_replaced_and_nothing_unfinished_stays()
    {
        var path = Path.Combine(_folder, "page.html");
        File.WriteAllText(path, "old");
        ReplacedFile.Write(path, "µ new");
        Assert.Equal([0xC2, 0xB5, .. " new"u8], File.ReadAllBytes(path)); // UTF-8 without a mark: micro sign is C2 B5.
        Assert.Equal([path], Directory.GetFiles(_folder));
    }

    [Fact]
    public void When_it_cannot_be_renamed_the_old_stays_and_nothing_unfinished_is_left()
    {
        var path = Path.Combine(_folder, "page.html");
        Directory.CreateDirectory(Path.Combine(path, "inside"));
        Assert.ThrowsAny<Exception>(() => ReplacedFile.Write(path, "new"));
        Assert.True(Directory.Exists(Path.Combine(path, "inside")));
        Assert.Empty(Directory.GetFiles(_folder));
    }

    [Fact]
    public void A_link_left_under_the_unfinished_name_is_not_followed()
    {
        var elsewhere = Path.Combine(_folder, "elsewhere.txt");
        File.WriteAllText(elsewhere, "precious");
        var path = Path.Combine(_folder, "page.html");
        try
        {
            File.CreateSymbolicLink(path + ReplacedFile.Unfinished, elsewhere);
        }
        catch (IOException)
        {
            // This account may not make links (Windows without that right): then nobody can lay one here either.
            return;
        }

        ReplacedFile.Write(path, "new");
        Assert.Equal("precious", File.ReadAllText(elsewhere));
        Assert.Equal("new", File.ReadAllText(path));
    }
}
