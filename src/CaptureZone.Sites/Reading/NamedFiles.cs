using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;
using System.Security.Cryptography;

namespace CaptureZone.Sites.Reading;

/// <summary>The files that a site file names; keeps their bytes, because they belong to the site's fingerprint.</summary>
/// <param name="files">Where they are read from.</param>
internal sealed class NamedFiles(ISiteFiles files) : ISiteFiles
{
    private readonly List<(string Name, byte[] Bytes)> _read = [];

    /// <inheritdoc/>
    public bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem)
    {
        problem = null;
        bytes = _read.Find(file => file.Name == name).Bytes;
        if (bytes is not null)
        {
            return true;
        }

        if (!files.TryRead(name, out bytes, out problem))
        {
            return false;
        }

        _read.Add((name, bytes));
        return true;
    }

    /// <summary>SHA-256 of the site file's bytes and then of those of the files in the order in which they were named.</summary>
    /// <param name="siteFile">The site file's bytes.</param>
    public string Fingerprint(byte[] siteFile)
    {
        using IncrementalHash hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        ImmutableArray<byte[]> all = [siteFile, .. _read.Select(file => file.Bytes)];
        foreach (byte[] bytes in all)
        {
            hash.AppendData(bytes);
        }

        return Convert.ToHexStringLower(hash.GetHashAndReset());
    }
}
