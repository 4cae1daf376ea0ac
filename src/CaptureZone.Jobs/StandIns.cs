#pragma warning disable CS1591, IDE0060, CA1822, SA1402
using System.Diagnostics.CodeAnalysis;

namespace CaptureZone.Sites.Reading;

public interface ISiteFiles
{
    bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem);
}

public sealed class DiskFiles(string folder) : ISiteFiles
{
    public bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem) =>
        throw new NotSupportedException(folder);
}

public static class SiteReader
{
    public static SiteReading Read(string fileName, byte[] bytes, ISiteFiles files) => throw new NotSupportedException();
}

public static class NewSite
{
    public static string Text(bool us) => us ? "us = true\n" : "us = false\n";
}
