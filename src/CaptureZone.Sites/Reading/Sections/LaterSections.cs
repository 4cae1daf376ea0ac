namespace CaptureZone.Sites.Reading.Sections;

/// <summary>
/// Tables of the site file that this version does not compute with. Each is an error: to pass over a stream or a wall would give
/// a silently wrong answer.
/// </summary>
internal static class LaterSections
{
    private static readonly string[] Names =
    [
        "stream", "wall", "conductivity_area", "recharge_area", "sizing", "uncertainty", "water_levels", "head_pair", "scenario",
    ];

    /// <summary>Complains of each such table.</summary>
    /// <param name="root">The root table.</param>
    public static void Refuse(TableReader root)
    {
        foreach (string name in Names.Where(root.Has))
        {
            root.ErrorAtKey(name, $"this version does not compute with {Words.Quote(name)} yet; the file must leave it out");
        }
    }

    /// <summary>Whether a path lies in such a table.</summary>
    /// <param name="path">The path of a value.</param>
    public static bool Holds(string path) => Names.Contains(path.Split('.')[0]);
}
