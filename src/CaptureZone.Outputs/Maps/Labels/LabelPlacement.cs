using System.Collections.Immutable;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Labels in their places: no two share a place, none lies on a symbol, none crosses the frame.</summary>
/// <param name="Labels">Labels that found a place.</param>
/// <param name="LeftOut">Labels that must not be lost, yet found none.</param>
/// <param name="Taken">Everything that fills a place: symbols, labels, leaders.</param>
internal sealed record LabelPlacement(
    ImmutableArray<PlacedLabel> Labels, ImmutableArray<LabelRequest> LeftOut, ImmutableArray<LabelBox> Taken)
{
    /// <summary>Clear paper between two labels, units of the sheet.</summary>
    private const float Gap = 5;

    private const float LeaderClearance = 6;

    /// <summary>Gives each label in turn the first of its spots that is free.</summary>
    /// <param name="area">Where labels may stand.</param>
    /// <param name="symbols">What they may not cover.</param>
    /// <param name="heavyLines">What they cover only where nothing else is free beside their thing.</param>
    /// <param name="requests">The labels, most important first.</param>
    public static LabelPlacement Of(
        SKRect area, IReadOnlyList<LabelBox> symbols, IReadOnlyList<LabelBox> heavyLines, IEnumerable<LabelRequest> requests)
    {
        List<LabelBox> taken = [.. symbols];
        List<PlacedLabel> labels = [];
        List<LabelRequest> leftOut = [];
        foreach (LabelRequest request in requests)
        {
            IEnumerable<PlacedLabel> all = request.Spots.Select(spot => new PlacedLabel(request.Block, spot));
            PlacedLabel? found = Find(all.Where(label => label.Leader is null), Clear);
            if (!request.Optional)
            {
                found ??= Find(all, LeaderClear) ?? Find(all, _ => true);
            }

            if (found is { } label)
            {
                labels.Add(label);
                taken.Add(label.Box);
                if (label.Leader is { } leader)
                {
                    taken.Add(LabelBox.Around(leader.From, leader.To, LeaderClearance));
                }
            }
            else if (!request.Optional)
            {
                leftOut.Add(request);
            }
        }

        return new([.. labels], [.. leftOut], [.. taken]);

        PlacedLabel? Find(IEnumerable<PlacedLabel> spots, Func<PlacedLabel, bool> suits) =>
            spots.FirstOrDefault(label => label.Box.Within(area) && Free(label.Box.Grown(Gap), taken) && suits(label));

        bool Clear(PlacedLabel label) => Free(label.Box, heavyLines);

        bool LeaderClear(PlacedLabel label) =>
            label.Leader is not { } leader || Free(LabelBox.Around(leader.From, leader.To, LeaderClearance), taken);
    }

    /// <summary>Draws the labels and their leaders.</summary>
    /// <param name="canvas">Where to.</param>
    public void Draw(IMapCanvas canvas)
    {
        foreach (PlacedLabel label in Labels)
        {
            if (label.Leader is { } leader)
            {
                canvas.Stroke(Shape.Line(leader.From, leader.To), Look.LeaderPen);
            }
        }

        foreach (MapText text in Labels.SelectMany(label => label.Block.Texts(label.Spot)))
        {
            canvas.Write(text);
        }
    }

    private static bool Free(LabelBox box, IReadOnlyList<LabelBox> taken)
    {
        foreach (LabelBox other in taken)
        {
            if (box.Meets(other))
            {
                return false;
            }
        }

        return true;
    }
}
