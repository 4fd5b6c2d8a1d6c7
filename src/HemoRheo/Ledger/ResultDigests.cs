using System.Security.Cryptography;
using System.Text;

namespace HemoRheo;

/// <summary>Digest over named results.</summary>
internal static class ResultDigests
{
    /// <summary>SHA-256 of one line a result, name and text parted by a tab, UTF-8.</summary>
    internal static string Of(IEnumerable<NamedText> results)
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (var result in results) hash.AppendData(Encoding.UTF8.GetBytes($"{result.Name}\t{result.Text}\n"));
        return Convert.ToHexStringLower(hash.GetHashAndReset());
    }
}
