namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>The map.</summary>
internal static class MapSection
{
    public static IEnumerable<Block> Of(Facts facts, string mapFile)
    {
        yield return new Heading(1, "Map") { StartsPage = true };
        yield return new Figure(
            $"Plan of the site with predicted heads, zones and plumes. Predicted by calculation, not measured. Coordinates: "
            + $"{facts.Site.Coordinates.Stated} ({facts.Site.Coordinates.Name}); grid north is up.",
            Description(facts),
            mapFile);
    }

    private static string Description(Facts facts)
    {
        string wells = facts.Wells.IsEmpty ? "no well" : "wells " + Facts.Names(facts.Wells.Select(well => well.Name));
        string plumes = facts.Answers.Plumes.IsEmpty
            ? "no plume"
            : (facts.Answers.Plumes.Length == 1 ? "plume " : "plumes ") + Facts.Names(facts.Plumes.Select(plume => plume.Plume.Name));
        return $"Map of {facts.Site.Title} with {wells}, {plumes}, predicted capture zones and travel-time zones, and lines of equal "
            + $"head every {facts.Print.Length(facts.Answers.ContourInterval)}.";
    }
}
