using System.Collections.Immutable;
using CaptureZone.Aquifers;
using CaptureZone.Sites.Coordinates;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>A site file as it stands, in its own coordinates; what could not be read is null.</summary>
internal sealed record SiteDraft(
    string? Title,
    Aquifer? Aquifer,
    RegionalDraft? Regional,
    ImmutableArray<WellDraft> Wells,
    ImmutableArray<PlumeDraft> Plumes,
    ZonesDraft Zones,
    ReportSettings Report,
    ImmutableArray<(string Name, Geometry Shape)> Backdrops,
    IReadOnlyDictionary<string, string> Sources);

/// <summary>Reads the whole file: what stands before all tables, and each table by its own reader.</summary>
internal static class RootSection
{
    private static readonly Field Format =
        new("format", "", "1") { Required = true, Limit = new Limit(value => value == 1, "1, the only format that this version reads") };

    private static readonly Field Title = new("title", "", "Larkspur Plating Works, chromium plume") { Required = true };
    private static readonly Field Crs = new("crs", "", "EPSG:26914") { Required = true };

    /// <summary>The file; null when its format is another one, for then nothing else can be judged.</summary>
    /// <param name="root">The root table.</param>
    public static SiteDraft? Read(TableReader root)
    {
        double? format = root.Number(Format, QuantityKind.Ratio);
        if (root.Has(Format.Key) && format is null)
        {
            return null;
        }

        string? title = root.Text(Title);
        string? problem = ReadCoordinates(root);
        SiteDraft draft = ReadTables(root, title);
        LaterSections.Refuse(root);
        root.Finish();
        if (problem is not null)
        {
            root.Error(Crs.Key, $"{problem}{PlaceChecks.ZoneHint(root.Site)}");
        }

        return draft;
    }

    private static SiteDraft ReadTables(TableReader root, string? title)
    {
        bool plumesGiven = root.Has("plume");
        Aquifer? aquifer = root.One("aquifer", required: true) is { } a ? AquiferSection.Read(a) : null;
        RegionalDraft? regional = root.One("regional_flow", required: true) is { } r ? RegionalFlowSection.Read(r) : null;
        ImmutableArray<WellDraft> wells = [.. root.Many("well", namesDiffer: true).Select(table => WellSection.Read(table, plumesGiven))];
        ImmutableArray<PlumeDraft> plumes = [.. root.Many("plume", namesDiffer: true).Select(PlumeSection.Read)];
        ZonesDraft zones = ZonesSection.Read(root.One("zones") ?? root.Nothing("zones"));
        ReportSettings report = ReportSection.Read(root.One("report") ?? root.Nothing("report"));
        ImmutableArray<(string, Geometry)> backdrops = [.. root.Many("backdrop").Select(BackdropSection.Read).OfType<(string, Geometry)>()];
        Dictionary<string, string> sources = root.Raw("sources") is { } s ? SourcesSection.Read(s, root.Site) : [];
        return new SiteDraft(title, aquifer, regional, wells, plumes, zones, report, backdrops, sources);
    }

    /// <summary>Reads the coordinate system; the problem is told last, when the places are known.</summary>
    private static string? ReadCoordinates(TableReader root)
    {
        if (root.Text(Crs) is not { } stated)
        {
            return null;
        }

        bool known = CoordinateSystems.TryRead(stated, root.Site.Files, out CoordinateSystem? system, out string problem);
        root.Site.Coordinates = system;
        return known ? null : problem;
    }
}
