using System.Reflection.Metadata;
using System.Reflection.PortableExecutable;

namespace HemoRheo.Notebooks.Tests;

public sealed class AssemblyReferencesTests
{
    [Fact]
    public void A_reference_is_moved_and_no_other_byte_s_meaning_changes()
    {
        var image = File.ReadAllBytes(Path.Combine(AppContext.BaseDirectory, "Giraffe.ViewEngine.dll"));
        var before = References(image);

        AssemblyReferences.Move(image, "FSharp.Core", new(10, 1, 2, 3));

        var after = References(image);
        Assert.NotEqual(new Version(10, 1, 2, 3), before["FSharp.Core"]);
        Assert.Equal(new Version(10, 1, 2, 3), after["FSharp.Core"]);
        before.Remove("FSharp.Core");
        after.Remove("FSharp.Core");
        Assert.Equal(before, after);
    }

    private static Dictionary<string, Version> References(byte[] image)
    {
        using var file = new PEReader(new MemoryStream((byte[])image.Clone()));
        var metadata = file.GetMetadataReader();
        return metadata.AssemblyReferences.Select(metadata.GetAssemblyReference).ToDictionary(reference => metadata.GetString(reference.Name), reference => reference.Version);
    }
}
