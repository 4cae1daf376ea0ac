using System.Collections.Immutable;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Sites.Coordinates;
using CaptureZone.Sites.Reading.Sections;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading;

/// <summary>Makes the document of a file without errors: everything in local metres and days.</summary>
/// <param name="draft">The file as it stands; nothing in it is missing.</param>
/// <param name="site">What all readers share.</param>
internal sealed class SiteAssembly(SiteDraft draft, SiteContext site)
{
    private readonly SiteFrame _frame = FrameOf(draft, site.Coordinates!);

    /// <summary>The document.</summary>
    /// <param name="fileName">The file's name, as the user gave it.</param>
    /// <param name="bytes">The file's bytes.</param>
    public SiteDocument Document(string fileName, byte[] bytes) => new()
    {
        FileName = fileName,
        Text = site.Complaints.Source.Text,
        Sha256 = site.Files.Fingerprint(bytes),
        Title = draft.Title!,
        Coordinates = site.Coordinates!,
        Frame = _frame,
        Model = Model(),
        Questions = Questions(),
        TravelTimeLabels = [.. draft.Zones.TravelTimes.Select(time => time.Written)],
        Report = draft.Report,
        Inputs = [.. site.Inputs.OrderBy(input => input.Offset).Select(input => Sourced(input.Entry))],
        Backdrops = [.. draft.Backdrops.Select(backdrop => new Backdrop(backdrop.Name, Local(backdrop.Shape)))],
        Warnings = site.Complaints.InOrder(),
    };

    private Model Model()
    {
        RegionalDraft regional = draft.Regional!;
        ImmutableArray<Element> wells = [.. draft.Wells.Select(Well)];
        return new Model(
            draft.Aquifer!,
            new RegionalFlow(regional.Gradient!.Value, regional.Direction!.Value, regional.Head!.Value, Local(regional.HeadAt!)),
            wells);
    }

    private Well Well(WellDraft well) => new(well.Name!, Local(well.At!), well.Rate!.Value, well.Radius!.Value, well.Purpose);

    private Questions Questions()
    {
        Envelope? extent = draft.Zones.Extent is { } frame
            ? new Envelope(Inner(new Coordinate(frame.MinX, frame.MinY)), Inner(new Coordinate(frame.MaxX, frame.MaxY)))
            : null;
        return new Questions(
            [.. draft.Plumes.Select(plume => new Plume(plume.Name!, (Polygon)Local(plume.Outline!), plume.Retardation!.Value))],
            [.. draft.Zones.TravelTimes.Select(time => time.Value)],
            extent,
            draft.Report.Units == ReportUnits.Us ? Units.UnitTable.Named("ft").Factor : 1);
    }

    private InputEntry Sourced(InputEntry entry) => entry with { Source = draft.Sources.GetValueOrDefault(entry.Key, "") };

    private System.Numerics.Complex Local(Coordinate place) => _frame.ToLocal(place.X, place.Y);

    private Coordinate Inner(Coordinate place)
    {
        System.Numerics.Complex local = Local(place);
        return new Coordinate(local.Real, local.Imaginary);
    }

    private Geometry Local(Geometry shape)
    {
        Geometry local = shape.Copy();
        local.Apply(new IntoFrame(this));
        return local;
    }

    /// <summary>Centred on wells, plumes and the place of the known head.</summary>
    private static SiteFrame FrameOf(SiteDraft draft, CoordinateSystem system)
    {
        Coordinate[] anchors =
        [
            .. draft.Wells.Select(well => well.At!),
            .. draft.Plumes.Select(plume => plume.Outline!.Centroid.Coordinate),
            draft.Regional!.HeadAt!,
        ];
        return CoordinateSystems.FrameFor(system, anchors.Average(place => place.X), anchors.Average(place => place.Y));
    }

    private sealed class IntoFrame(SiteAssembly assembly) : IEntireCoordinateSequenceFilter
    {
        public bool Done => false;

        public bool GeometryChanged => true;

        public void Filter(CoordinateSequence sequence)
        {
            for (int i = 0; i < sequence.Count; i++)
            {
                Coordinate local = assembly.Inner(sequence.GetCoordinate(i));
                sequence.SetOrdinate(i, 0, local.X);
                sequence.SetOrdinate(i, 1, local.Y);
            }
        }
    }
}
