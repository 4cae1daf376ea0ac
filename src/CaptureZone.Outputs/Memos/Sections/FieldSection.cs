namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What would show in the field whether the prediction holds.</summary>
internal static class FieldSection
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "What to measure in the field"),
        new Paragraph(
            "Capture is judged in the field by several lines of evidence together (US EPA 2008). Before and during pumping, measure:"),
        new Bullets(
        [
            "Water levels in a round of all wells on one day, pumps off and pumps on, on the vertical datum of this memo; draw the "
                + "measured heads beside the predicted ones.",
            "Pairs of piezometers across the predicted edge of the zone, between the wells and near the stagnation points: the gradient "
                + "must point inward there.",
            "Rates and levels of every pumping well, continuously, losses in the wells included.",
            "Conductivity by a pumping test; one that also gives the storage, from which the time to steady state follows.",
            "Vertical head differences between nested screens, above, in and below the interval that is computed.",
            .. facts.Answers.Plumes.IsEmpty
                ? Array.Empty<string>()
                :
                [
                    "Concentrations downgradient of the wells, over several travel times: they must fall where the water is cut off.",
                    "The plume's outline, sideways and at depth, where the margin is smallest.",
                ],
        ]),
    ];
}
