using System.Globalization;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What of the site is computed, over which vertical interval, and what is left out.</summary>
internal static class ConceptualModelSection
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "Conceptual model"),
        new Paragraph(
            "Ground water is taken to flow in plan, at steady state, through one aquifer on a level base, of one hydraulic conductivity "
            + "and one effective porosity. Uniform regional flow and the wells act together."),
        new Bullets([VerticalInterval(facts), RegionalFlow(facts), .. facts.Wells.Select(well => Well(well, facts)), Place(facts)]),
        new Heading(2, "Left out"),
        new Bullets(
        [
            "Vertical flow: every well is taken to be screened over the whole saturated thickness.",
            "Change with time: storage, seasons, the start and stop of pumps.",
            "Variation of conductivity, porosity and thickness from place to place, and with direction.",
            "Recharge, leakage through confining beds, streams and walls: the site file gives none.",
            "Dispersion, diffusion, decay and density; sorption enters only as each plume's retardation.",
            "Losses inside the wells: the levels in the wells are lower than the heads at the screens.",
        ]),
    ];

    private static string VerticalInterval(Facts facts)
    {
        string datum = facts.Site.Report.VerticalDatum;
        string interval = facts.Aquifer.Top is { } top
            ? $"base {facts.Print.Elevation(facts.Aquifer.Base)}, top {facts.Print.Elevation(top)} (underside of the confining bed), "
                + $"thickness {facts.Print.Length(facts.Aquifer.Thickness)}"
            : $"base {facts.Print.Elevation(facts.Aquifer.Base)}, no confining bed: water table everywhere, "
                + $"{facts.Print.Length(facts.Thickness)} saturated where the head is known";
        return $"Vertical interval: {interval}. Vertical datum: {Facts.OrNotGiven(datum)}.";
    }

    private static string RegionalFlow(Facts facts)
    {
        RegionalFlow regional = facts.Site.Model.Regional;
        string flow = regional.Gradient > 0
            ? $"gradient {facts.Print.Ratio(regional.Gradient)} toward {facts.Print.Direction(Azimuth(regional))} clockwise from grid "
                + $"north, {facts.Print.Transmissivity(facts.DischargePerWidth)} of discharge per unit width"
            : "none";
        return $"Regional flow: {flow}. Known head: {facts.Print.Elevation(regional.Head)} at {At(regional.HeadAt, facts)}, "
            + $"held there with everything acting.";
    }

    /// <summary>From the mathematical angle to degrees clockwise from grid north, 0 to 360.</summary>
    private static double Azimuth(RegionalFlow regional)
    {
        double degrees = 90 - regional.Direction * 180 / Math.PI;
        return degrees - 360 * Math.Floor(degrees / 360);
    }

    private static string Well(Well well, Facts facts)
    {
        string work = well.Rate switch
        {
            > 0 => $"extracts {facts.Print.Rate(well.Rate)}",
            < 0 => $"injects {facts.Print.Rate(-well.Rate)}",
            _ => "stands idle",
        };
        return $"Well {well.Name} at {At(well.At, facts)} {work}{Purpose(well)}.";
    }

    private static string Purpose(Well well) => well.Purpose switch
    {
        WellPurpose.Containment => " for containment",
        WellPurpose.Supply => " for supply",
        _ => "",
    };

    private static string Place(Facts facts)
    {
        CoordinateSystem system = facts.Site.Coordinates;
        return $"Coordinates: {system.Stated} ({system.Name}), unit {system.Unit}; north is grid north.";
    }

    private static string At(System.Numerics.Complex local, Facts facts)
    {
        SiteFrame frame = facts.Site.Frame;
        return string.Create(CultureInfo.InvariantCulture, $"x {frame.SiteX(local):0.#}, y {frame.SiteY(local):0.#}");
    }
}
