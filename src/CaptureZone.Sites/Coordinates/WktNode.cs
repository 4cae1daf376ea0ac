using System.Collections.Immutable;
using System.Globalization;

namespace CaptureZone.Sites.Coordinates;

/// <summary>A node of well-known text: KEYWORD["text", 1.5, WORD, NODE[...], ...].</summary>
/// <param name="Keyword">Its keyword, in upper case.</param>
/// <param name="Values">Its texts, numbers and words, in order.</param>
/// <param name="Nodes">Its inner nodes, in order.</param>
internal sealed record WktNode(string Keyword, ImmutableArray<string> Values, ImmutableArray<WktNode> Nodes)
{
    /// <summary>Its first text, or an empty one.</summary>
    public string Name => Values.FirstOrDefault(string.Empty);

    /// <summary>Its inner nodes of a keyword.</summary>
    /// <param name="keyword">The keyword.</param>
    public IEnumerable<WktNode> Of(string keyword) => Nodes.Where(node => node.Keyword == keyword);

    /// <summary>A value as a finite number; null when it is missing or none.</summary>
    /// <param name="index">Its place among the values.</param>
    public double? Number(int index) =>
        index < Values.Length
        && double.TryParse(Values[index], NumberStyles.Float, CultureInfo.InvariantCulture, out double value)
        && double.IsFinite(value)
            ? value
            : null;
}
