namespace CaptureZone.Jobs.Files;

/// <summary>
/// Names for what is under way beside the place it is meant for: <c>NAME.new-1a2b3c4d</c> while it is written,
/// <c>NAME.old-1a2b3c4d</c> while it is being replaced.
/// </summary>
internal static class Sibling
{
    /// <summary>Marks what is being written.</summary>
    public const string New = ".new-";

    /// <summary>Marks what is being replaced.</summary>
    public const string Old = ".old-";

    private const int IdLength = 8;

    /// <summary>A name beside a path that nothing else has.</summary>
    /// <param name="path">The path that is meant in the end.</param>
    /// <param name="mark">What the sibling is.</param>
    public static string Name(string path, string mark) => path + mark + Guid.NewGuid().ToString("N")[..IdLength];

    /// <summary>The folders of such a name beside a path, in the order of their names.</summary>
    /// <param name="path">The path that is meant in the end.</param>
    /// <param name="mark">What the siblings are.</param>
    public static IReadOnlyList<string> FoldersOf(string path, string mark)
    {
        string prefix = Path.GetFileName(path) + mark;
        return
        [
            .. new DirectoryInfo(Path.GetDirectoryName(path)!).EnumerateDirectories()
                .Where(folder => folder.LinkTarget is null && IsSibling(folder.Name, prefix))
                .Select(folder => folder.FullName)
                .Order(StringComparer.Ordinal),
        ];
    }

    private static bool IsSibling(string name, string prefix) =>
        name.Length == prefix.Length + IdLength
        && name.StartsWith(prefix, StringComparison.Ordinal)
        && name.AsSpan(prefix.Length).IndexOfAnyExcept("0123456789abcdef") < 0;
}
