#pragma warning disable CS1591, IDE0060, CA1822, SA1402
using System.Diagnostics.CodeAnalysis;

namespace CaptureZone.Sites.Reading
{
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
}

namespace CaptureZone.Outputs.Standing
{
    public sealed record MapPictures(byte[] Png, byte[] Svg);

    public static class GeoJsonFiles
    {
        public static void Write(Report report, string folder) => File.WriteAllText(Path.Combine(folder, "paths.geojson"), "{}");
    }

    public static class GeoPackageFile
    {
        public static void Write(Report report, string path) => File.WriteAllText(path, "");
    }

    public static class ShapefileFolder
    {
        public static void Write(Report report, string folder) => File.WriteAllText(Path.Combine(folder, "paths.shp"), "");
    }

    public static class PlanMap
    {
        public static MapPictures Draw(Report report) => new([1], [2]);
    }
}
