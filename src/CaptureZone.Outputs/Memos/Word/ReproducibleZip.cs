using System.IO.Compression;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Packs a package anew so that its bytes depend on its content alone.</summary>
internal static class ReproducibleZip
{
    /// <summary>The first time that a ZIP archive can state.</summary>
    private static readonly DateTimeOffset Time = new(1980, 1, 1, 0, 0, 0, TimeSpan.Zero);

    /// <summary>The same entries in ordinal order, all at one time.</summary>
    /// <param name="package">The package.</param>
    public static byte[] Of(MemoryStream package)
    {
        package.Position = 0;
        using MemoryStream packed = new();
        using (ZipArchive from = new(package, ZipArchiveMode.Read, leaveOpen: true))
        using (ZipArchive to = new(packed, ZipArchiveMode.Create, leaveOpen: true))
        {
            foreach (ZipArchiveEntry entry in from.Entries.OrderBy(entry => entry.FullName, StringComparer.Ordinal))
            {
                Copy(entry, to);
            }
        }

        return packed.ToArray();
    }

    private static void Copy(ZipArchiveEntry entry, ZipArchive to)
    {
        ZipArchiveEntry copy = to.CreateEntry(entry.FullName, CompressionLevel.Optimal);
        copy.LastWriteTime = Time;
        using Stream source = entry.Open();
        using Stream target = copy.Open();
        source.CopyTo(target);
    }
}
