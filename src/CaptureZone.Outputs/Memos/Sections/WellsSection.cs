using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What is predicted for each well.</summary>
internal static class WellsSection
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "Results per well"),
        .. facts.Wells.IsEmpty ? [new Paragraph("The site file names no well.")] : Levels(facts),
        .. facts.Zones.Any() ? Zones(facts) : [],
        .. facts.Zones.Any() && !facts.Answers.Questions.TravelTimes.IsEmpty ? TravelTimes(facts) : [],
    ];

    private static IEnumerable<Block> Levels(Facts facts)
    {
        yield return new Table(
            "Rates, and predicted heads and drawdowns at the screens.",
            [
                new("Well", 16), new("Purpose", 16), facts.NumberColumn("Rate", QuantityKind.Rate, 15),
                facts.NumberColumn("Head at screen", QuantityKind.Length, 18),
                facts.NumberColumn("Drawdown at screen", QuantityKind.Length, 18),
                facts.NumberColumn("Largest rate", QuantityKind.Rate, 17),
            ],
            [.. facts.Answers.Wells.Select(answer => Levels(facts.Wells[answer.Well], answer, facts))]);
        yield return new Paragraph(
            "Rates are positive for extraction and negative for injection. The head is the mean round the screen, without "
            + "losses inside the well. The drawdown is the head with all wells off less the head with them on, under "
            + "the same known head; negative where the level rises. The largest rate, the others held, brings the "
            + "level at the screen to the base: a theoretical ceiling and not a rate to pump.");
    }

    private static ImmutableArray<string> Levels(Well well, WellAnswer answer, Facts facts) =>
    [
        well.Name,
        Purpose(well),
        facts.Print.Number(QuantityKind.Rate, well.Rate),
        facts.Print.ElevationNumber(answer.HeadAtScreen),
        facts.Print.Number(QuantityKind.Length, answer.DrawdownAtScreen),
        answer.LargestRate is { } rate ? facts.Print.Number(QuantityKind.Rate, rate) : Printer.NotANumber,
    ];

    private static string Purpose(Well well) => well.Rate < 0 ? "injection" : WellText.Token(well.Purpose);

    private static IEnumerable<Block> Zones(Facts facts)
    {
        yield return new Table(
            "Predicted steady capture zones.",
            [
                new("Well", 12), new("Area", 12, IsNumeric: true), new("Area on the map", 14, IsNumeric: true),
                facts.NumberColumn("Width at the well", QuantityKind.Length, 14),
                facts.NumberColumn("Width far upgradient", QuantityKind.Length, 16),
                facts.NumberColumn("To stagnation point", QuantityKind.Length, 16), new("Its water comes from", 30),
            ],
            [.. facts.Zones.Select(zone => Zone(zone.Well, zone.Zone, facts))]);
        yield return new Paragraph(
            "A zone that is \"open\" reaches upgradient without end; its area on the map ends at the map's frame. The width at the well is "
            + "measured across the regional flow; the width far upgradient is what the zone tends to.");
    }

    private static ImmutableArray<string> Zone(Well well, WellZone zone, Facts facts) =>
    [
        well.Name,
        zone.Area is { } area ? facts.Print.Area(area) : "open",
        facts.Print.Area(zone.AreaInExtent),
        facts.Print.Number(QuantityKind.Length, zone.WidthAtWell),
        facts.Print.Number(QuantityKind.Length, zone.WidthUpgradient),
        facts.Print.Number(QuantityKind.Length, zone.StagnationDistance),
        string.Join(", ", zone.WaterFrom.Select(share =>
            $"{FateText.Source(share.Source, facts.Site.Model)} {facts.Print.Percent(share.Share)}")),
    ];

    private static IEnumerable<Block> TravelTimes(Facts facts)
    {
        yield return new Table(
            "Areas of the predicted travel-time zones: where the water is that reaches the well within the time.",
            [new("Well", 16), .. facts.Site.TravelTimeLabels.Select(label => new Column(label, 16, IsNumeric: true))],
            [.. facts.Zones.Select(zone => ImmutableArray.CreateRange(
                zone.Answer.TravelTimeZones.Select(within => facts.Print.Area(within.Area)).Prepend(zone.Well.Name)))]);
        yield return new Paragraph("Travel times are of water, without retardation. One year is 365.25 days.");
    }
}
