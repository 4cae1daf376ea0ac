namespace CaptureZone.Jobs.Summaries;

/// <summary>Writes rows as columns of plain text.</summary>
internal static class TextTable
{
    private const string Indent = "  ";
    private const string Gap = "  ";

    /// <summary>Writes the rows, each column as wide as its widest text.</summary>
    /// <param name="to">Where to.</param>
    /// <param name="rows">The rows, all with the same number of columns.</param>
    public static void Write(TextWriter to, IReadOnlyList<IReadOnlyList<string>> rows)
    {
        int[] widths = [.. Enumerable.Range(0, rows[0].Count).Select(column => rows.Max(row => row[column].Length))];
        foreach (IReadOnlyList<string> row in rows)
        {
            to.WriteLine((Indent + string.Join(Gap, row.Select((text, column) => text.PadRight(widths[column])))).TrimEnd());
        }
    }
}
