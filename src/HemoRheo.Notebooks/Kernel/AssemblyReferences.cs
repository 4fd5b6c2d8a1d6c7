using System.Reflection.Metadata;
using System.Reflection.Metadata.Ecma335;
using System.Reflection.PortableExecutable;

namespace HemoRheo.Notebooks;

/// <summary>Changes which version of another assembly an assembly asks for.</summary>
internal static class AssemblyReferences
{
    /// <summary>Writes a new version into the reference, in place. The version is the first eight bytes of a row of the AssemblyRef table (ECMA-335, II.22.5).</summary>
    /// <param name="image">The assembly's bytes.</param>
    /// <param name="name">Simple name of the assembly that is asked for.</param>
    /// <param name="version">The version to ask for.</param>
    public static void Move(byte[] image, string name, Version version)
    {
        using var file = new PEReader(new MemoryStream(image));
        var metadata = file.GetMetadataReader();
        var table = file.PEHeaders.MetadataStartOffset + metadata.GetTableMetadataOffset(TableIndex.AssemblyRef);
        foreach (var handle in metadata.AssemblyReferences)
        {
            if (metadata.GetString(metadata.GetAssemblyReference(handle).Name) != name) continue;
            var row = table + metadata.GetTableRowSize(TableIndex.AssemblyRef) * (MetadataTokens.GetRowNumber(handle) - 1);
            int[] parts = [version.Major, version.Minor, version.Build, version.Revision];
            for (var i = 0; i < parts.Length; i++) BitConverter.TryWriteBytes(image.AsSpan(row + 2 * i), (ushort)parts[i]);
        }
    }
}
