using CaptureZone.Elements.Wells;
using NetTopologySuite.Geometries;
using Dimension = CaptureZone.Sites.Units.Dimension;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>A well as the file gives it.</summary>
/// <param name="Name">Its name.</param>
/// <param name="At">Its place, in the site's coordinates.</param>
/// <param name="Rate">What it takes out, m3/d; negative when it injects.</param>
/// <param name="Radius">Radius of the screen's bore, m.</param>
/// <param name="Purpose">What it is for.</param>
/// <param name="Offset">Where its place stands in the file.</param>
internal sealed record WellDraft(string? Name, Coordinate? At, double? Rate, double? Radius, WellPurpose Purpose, int Offset);

/// <summary>Reads one [[well]].</summary>
internal static class WellSection
{
    private static readonly Limit Pumped = new(value => value >= 0, "0 or more; extracts and injects say which way the water goes");

    private static readonly Field Name = new("name", "", "RW-1") { Required = true };
    private static readonly Field At = new("at", "Place of the well", "[562310.0, 4641240.0]") { Required = true };
    private static readonly Field Extracts = new("extracts", "Extraction rate", "6.5 L/s") { Limit = Pumped, Usual = UsualRange.Rate };
    private static readonly Field Injects = new("injects", "Injection rate", "6.5 L/s") { Limit = Pumped, Usual = UsualRange.Rate };
    private static readonly Field Radius =
        new("radius", "Radius of the screen's bore", "0.15 m") { Required = true, Limit = Limit.Positive, Usual = UsualRange.Radius };

    private static readonly Field Purpose = new("purpose", "", "containment");

    /// <summary>The well.</summary>
    /// <param name="table">The table.</param>
    /// <param name="plumesGiven">Whether the file gives a plume, so that a purpose must be said.</param>
    public static WellDraft Read(TableReader table, bool plumesGiven)
    {
        string? name = table.Text(Name);
        Coordinate? at = table.Place(At);
        double? extracts = table.Quantity(Extracts, Dimension.Rate);
        double? injects = table.Quantity(Injects, Dimension.Rate);
        double? radius = table.Quantity(Radius, Dimension.Length);
        WellPurpose? purpose = table.Choice(
            Purpose, ("containment", WellPurpose.Containment), ("supply", WellPurpose.Supply), ("other", WellPurpose.Other));
        CheckRates(table);
        CheckPurpose(table, purpose, plumesGiven);
        table.Finish();
        return new WellDraft(name, at, extracts ?? -injects, radius, purpose ?? WellPurpose.Other, table.PlaceOf("at"));
    }

    private static void CheckRates(TableReader table)
    {
        if (table.Has("extracts") && table.Has("injects"))
        {
            table.Error("injects", "a well either extracts or injects; leave one of the two out");
        }
        else if (!table.Has("extracts") && !table.Has("injects"))
        {
            table.Missing(
                "extracts",
                "[[well]] lacks a rate; add a line such as extracts = \"6.5 L/s\" (\"0 L/s\" when it stands idle), or injects = ...");
        }
    }

    private static void CheckPurpose(TableReader table, WellPurpose? purpose, bool plumesGiven)
    {
        if (plumesGiven && table.Has("extracts") && !table.Has("purpose"))
        {
            table.Missing(
                "purpose",
                "[[well]] lacks purpose, which must be said where a plume is given: only wells for \"containment\" count as capture; "
                + "add purpose = \"containment\", \"supply\" or \"other\"");
        }

        if (table.Has("injects") && purpose is WellPurpose.Containment or WellPurpose.Supply)
        {
            table.Error(
                "purpose",
                "the purpose of a well that injects can only be \"other\", since capture counts what is extracted; leave it out");
        }
    }
}
