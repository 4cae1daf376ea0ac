namespace CaptureZone.Sites.Reading;

/// <summary>Finds the key that was probably meant.</summary>
internal static class NearestKey
{
    /// <summary>The nearest of the known keys, or null when none is near: at most a third of its letters may differ, or two.</summary>
    /// <param name="found">What was written.</param>
    /// <param name="known">What is known.</param>
    public static string? Of(string found, IEnumerable<string> known) =>
        known.Select(key => (key, distance: Distance(found.ToLowerInvariant(), key.ToLowerInvariant())))
            .Where(pair => pair.distance <= Math.Max(2, pair.key.Length / 3) && pair.distance < pair.key.Length)
            .OrderBy(pair => pair.distance)
            .Select(pair => pair.key)
            .FirstOrDefault();

    /// <summary>Least number of letters to insert, delete or replace (V.I. Levenshtein, Soviet Physics Doklady 10, 1966).</summary>
    private static int Distance(string a, string b)
    {
        int[] row = [.. Enumerable.Range(0, b.Length + 1)];
        for (int i = 1; i <= a.Length; i++)
        {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int replaced = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.Min(replaced, Math.Min(row[j], row[j - 1]) + 1);
            }
        }

        return row[^1];
    }
}
