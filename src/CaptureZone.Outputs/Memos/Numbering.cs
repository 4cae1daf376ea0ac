using System.Globalization;

namespace CaptureZone.Outputs.Memos;

/// <summary>Numbers sections, tables and figures in the order in which they are read.</summary>
internal static class Numbering
{
    /// <summary>The blocks with their numbers.</summary>
    /// <param name="blocks">Blocks without numbers.</param>
    public static IEnumerable<Block> Of(IEnumerable<Block> blocks)
    {
        int sections = 0, tables = 0, figures = 0;
        foreach (Block block in blocks)
        {
            yield return block switch
            {
                Heading { IsCounted: true } heading =>
                    heading with { Number = string.Create(CultureInfo.InvariantCulture, $"{++sections}.") },
                Table table => table with { Number = ++tables },
                Figure figure => figure with { Number = ++figures },
                _ => block,
            };
        }
    }
}
