namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What the reader is asked to decide.</summary>
internal static class DecisionSection
{
    public static IEnumerable<Block> Of(Facts facts)
    {
        yield return new Heading(1, "Decision asked for");
        yield return new Paragraph(Question(facts));
    }

    private static string Question(Facts facts)
    {
        if (!facts.Answers.Plumes.IsEmpty)
        {
            string wells = facts.Containment.IsEmpty
                ? "no pumping for containment"
                : $"the pumping of {Facts.Names(facts.Containment.Select(well => well.Name))} at the rates in Table 1";
            string plumes = Facts.Names(facts.Plumes.Select(plume => plume.Plume.Name));
            return $"To decide whether, at screening level, {wells} may be taken as the basis for containing the ground water of "
                + $"{plumes}, subject to the measurements in the field that this memo names.";
        }

        string extraction = Facts.Names(facts.Zones.Select(zone => zone.Well.Name));
        return extraction.Length == 0
            ? "None: the site file names no plume and no extraction well; this memo describes the regional flow alone."
            : $"To decide whether, at screening level, the zones in this memo may be taken as the land whose ground water feeds "
                + $"{extraction} at the rates in Table 1, subject to the measurements in the field that this memo names.";
    }
}
