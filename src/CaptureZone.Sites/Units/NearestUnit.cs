namespace CaptureZone.Sites.Units;

/// <summary>The known unit that an unknown one most likely means.</summary>
internal static class NearestUnit
{
    /// <summary>Edits (a letter more, less or other) that still count as a slip of the pen.</summary>
    private const int MostEdits = 1;

    /// <summary>The unit of a dimension whose spelling is nearest, the letters' case set aside; null when none is near.</summary>
    /// <param name="written">The unknown unit.</param>
    /// <param name="dimension">What it must measure.</param>
    public static Unit? To(string written, Dimension dimension)
    {
        string spelling = Plain(written);
        return UnitDefinitions.All
            .Where(unit => DimensionText.Fits(unit, dimension))
            .Select(unit => (Unit: unit, Edits: unit.AlsoWritten.Prepend(unit.Symbol).Min(text => Edits(spelling, Plain(text)))))
            .Where(candidate => candidate.Edits <= MostEdits && candidate.Edits < spelling.Length)
            .OrderBy(candidate => candidate.Edits)
            .FirstOrDefault()
            .Unit;
    }

    private static string Plain(string text) => UnitSpelling.Of(text.ToLowerInvariant()).ToLowerInvariant();

    /// <summary>Levenshtein's distance, one row at a time.</summary>
    private static int Edits(string a, string b)
    {
        int[] row = [.. Enumerable.Range(0, b.Length + 1)];
        for (int i = 1; i <= a.Length; i++)
        {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int substituted = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(substituted, Math.Min(row[j], row[j - 1]) + 1);
            }
        }

        return row[^1];
    }
}
