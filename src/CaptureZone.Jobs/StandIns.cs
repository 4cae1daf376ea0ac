#pragma warning disable CS1591, IDE0060, CA1822, SA1402
using System.Diagnostics.CodeAnalysis;
using System.Numerics;
using System.Text;
using CaptureZone.Flow;

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

namespace CaptureZone.Tracing
{
    public enum Sense
    {
        Downstream,
        Upstream,
    }

    public interface IPathSink
    {
        void Add(Complex at, double time);
    }

    public readonly record struct PathEnd(Complex At, Fate Fate, double Time, double Length, double FluxDrift);

    public sealed class Tracer(FlowField field)
    {
        public PathEnd Trace(Complex from, Sense sense, double longest, IPathSink? sink) => throw new NotSupportedException(field.ToString());
    }
}

namespace CaptureZone.Outputs.Standing
{
    public sealed record MapPictures(byte[] Png, byte[] Svg);

    public static class ResultsJson
    {
        public static void Write(Report report, Stream to) => to.Write(Encoding.UTF8.GetBytes("{}"));
    }

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

    public static class MemoFiles
    {
        public static void Write(Report report, byte[] mapPng, string folder) => File.WriteAllText(Path.Combine(folder, "memo.md"), "");
    }
}
