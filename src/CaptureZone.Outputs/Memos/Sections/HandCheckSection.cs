using System.Collections.Immutable;
using System.Globalization;
using CaptureZone.Elements.Wells;
using CaptureZone.Sites;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>Formulas for one well, worked by hand, beside what was computed with all wells.</summary>
internal static class HandCheckSection
{
    public static IEnumerable<Block> Of(Facts facts)
    {
        ImmutableArray<ImmutableArray<string>> rows =
        [
            .. facts.Zones.SelectMany(zone => Rows(zone.Well, zone.Answer, zone.Zone, facts)),
            .. Together(facts),
        ];
        if (rows.IsEmpty)
        {
            yield break;
        }

        yield return new Heading(1, "Hand check");
        yield return new Paragraph(Symbols(facts));
        yield return new Table(
            "Formulas for one well alone, beside the computed values.",
            [
                new("Well", 22), new("Quantity", 30), new("Formula", 20), facts.NumberColumn("By hand", QuantityKind.Length, 14),
                facts.NumberColumn("Computed", QuantityKind.Length, 16),
            ],
            rows);
        yield return new Paragraph(Remark(facts));
    }

    private static IEnumerable<ImmutableArray<string>> Rows(Well well, WellAnswer answer, WellZone zone, Facts facts)
    {
        double width = facts.DischargePerWidth;
        string Length(double? metres) => facts.Print.Number(QuantityKind.Length, metres);
        ImmutableArray<string> Row(string quantity, string formula, double hand, double? computed) =>
            [well.Name, quantity, formula, Length(hand), Length(computed)];
        if (width > 0)
        {
            yield return Row(
                "distance to stagnation point", "Q / (2 pi T i)", HandCheck.StagnationDistance(well.Rate, width), zone.StagnationDistance);
            yield return Row("width at the well", "Q / (2 T i)", HandCheck.WidthAtWell(well.Rate, width), zone.WidthAtWell);
            yield return Row("width far upgradient", "Q / (T i)", HandCheck.WidthUpgradient(well.Rate, width), zone.WidthUpgradient);
        }

        for (int i = 0; i < answer.TravelTimeZones.Length; i++)
        {
            TravelTimeZone within = answer.TravelTimeZones[i];
            double hand = HandCheck.FixedRadius(well.Rate, within.Time, facts.Aquifer.Porosity, facts.Thickness);
            yield return Row(
                $"radius for {facts.Site.TravelTimeLabels[i]}", "sqrt(Q t / (pi n b))", hand, HandCheck.EquivalentRadius(within.Area));
        }
    }

    /// <summary>The containment wells as one: only regional water that they take counts in the computed width.</summary>
    private static IEnumerable<ImmutableArray<string>> Together(Facts facts)
    {
        double?[] widths =
        [
            .. facts.Zones.Where(zone => zone.Well.Purpose == WellPurpose.Containment).Select(zone => zone.Zone.WidthUpgradient),
        ];
        if (facts.DischargePerWidth > 0 && widths.Length > 1 && widths.All(width => width is not null))
        {
            double hand = HandCheck.WidthUpgradient(facts.Containment.Sum(well => well.Rate), facts.DischargePerWidth);
            yield return
            [
                "containment, together", "width far upgradient", "Q / (T i)", facts.Print.Number(QuantityKind.Length, hand),
                facts.Print.Number(QuantityKind.Length, widths.Sum()),
            ];
        }
    }

    private static string Symbols(Facts facts) =>
        $"Q is the well's rate, T i = {facts.Print.Transmissivity(facts.DischargePerWidth)} the regional discharge per unit width, "
        + $"n = {facts.Print.Ratio(facts.Aquifer.Porosity)} the effective porosity, b = {facts.Print.Length(facts.Thickness)} the "
        + "saturated thickness where the head is known, t the time. Q / (2 T i) is also half of the width far upgradient. The "
        + "computed radius is that of a circle with the area of the travel-time zone.";

    private static string Remark(Facts facts)
    {
        int acting = facts.Wells.Count(well => well.Rate != 0);
        string why = acting > 1
            ? $"Here {acting.ToString(CultureInfo.InvariantCulture)} wells act together, so computed and hand values differ: neighbours "
                + "share the regional flow and move each other's stagnation points and edges, and injected water takes the place of "
                + "regional water, which narrows the zones far upgradient."
            : "Here one well acts alone, so computed and hand values should agree.";
        return $"Distances and widths by hand hold for one well alone in uniform flow. {why} The radii should agree "
            + "however many wells act, because a travel-time zone holds what the well takes in the time, "
            + "whatever its shape; they differ where injected water "
            + "enters inside the zone or the saturated thickness is not b everywhere.";
    }
}
