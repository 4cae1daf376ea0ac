using System.Collections.Immutable;

namespace CaptureZone.Outputs.Memos;

/// <summary>Sizes of paper.</summary>
public enum Paper
{
    /// <summary>210 mm x 297 mm, where reports are metric.</summary>
    A4,

    /// <summary>8.5 in x 11 in, where reports are in US units.</summary>
    Letter,
}

/// <summary>
/// A memo before it is written in any format: blocks in the order in which they are read. Every writer shows all of it and adds nothing.
/// </summary>
/// <param name="Title">Its title.</param>
/// <param name="RunningHead">What stands at the top of every page.</param>
/// <param name="Preparer">By whom; empty when not given.</param>
/// <param name="Caution">What stands at the foot of every page.</param>
/// <param name="Paper">Size of its pages.</param>
/// <param name="Blocks">Its blocks, numbered.</param>
public sealed record Memo(
    string Title, string RunningHead, string Preparer, string Caution, Paper Paper, ImmutableArray<Block> Blocks);
