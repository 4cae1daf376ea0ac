using CaptureZone.Sites.Coordinates;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading;

/// <summary>What the readers of all tables of one file share.</summary>
/// <param name="complaints">Where complaints go.</param>
/// <param name="files">The files that the site file names.</param>
internal sealed class SiteContext(Complaints complaints, NamedFiles files)
{
    /// <summary>Where complaints go.</summary>
    public Complaints Complaints => complaints;

    /// <summary>The files that the site file names.</summary>
    public NamedFiles Files => files;

    /// <summary>The coordinate system; null until it is read, and where it cannot be.</summary>
    public CoordinateSystem? Coordinates { get; set; }

    /// <summary>The inputs met so far, with their offsets; sources are filled in at the end.</summary>
    public List<(int Offset, InputEntry Entry)> Inputs { get; } = [];

    /// <summary>The path of every value that the file gives, such as "aquifer.conductivity".</summary>
    public HashSet<string> Paths { get; } = new(StringComparer.Ordinal);

    /// <summary>The path of every key that the tables of the file could give.</summary>
    public HashSet<string> KnownPaths { get; } = new(StringComparer.Ordinal);

    /// <summary>Paths of keys and tables that are needed and missing; that is told once, and not again by what refers to them.</summary>
    public HashSet<string> MissingPaths { get; } = new(StringComparer.Ordinal);

    /// <summary>All places that the file gives, value by value.</summary>
    public List<WrittenPlaces> Places { get; } = [];
}

/// <summary>Places that stand in one value of the site file.</summary>
/// <param name="Path">The value's path.</param>
/// <param name="Points">The places, in the site's coordinates.</param>
/// <param name="Offsets">Where each stands in the file; a single offset when they came from a file that it names.</param>
internal sealed record WrittenPlaces(string Path, IReadOnlyList<Coordinate> Points, IReadOnlyList<int> Offsets)
{
    /// <summary>Where a place stands.</summary>
    /// <param name="index">Its index.</param>
    public int OffsetOf(int index) => Offsets[Math.Min(index, Offsets.Count - 1)];
}
