using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>
/// Reads [sources]: paths of values of the same file, each with a text that says where the value came from. A path may stand
/// in quotes or bare, <c>"aquifer.porosity" = ...</c> or <c>aquifer.porosity = ...</c>.
/// </summary>
internal static class SourcesSection
{
    /// <summary>Where values came from, by path.</summary>
    /// <param name="table">The table.</param>
    /// <param name="site">What all readers share; every value of the file must have been read.</param>
    public static Dictionary<string, string> Read(TomlTable table, SiteContext site)
    {
        Dictionary<string, string> sources = new(StringComparer.Ordinal);
        foreach ((string path, TomlEntry entry) in Flat("", table))
        {
            if (entry.Value is not TomlText { Value.Length: > 0 } text)
            {
                site.Complaints.Error(
                    entry.Value.Start, $"a source must be a text in quotes, such as \"pumping test\"; found {Words.KindOf(entry.Value)}");
            }
            else if (site.Paths.Contains(path))
            {
                sources[path] = text.Value;
            }
            else if (!LaterSections.Holds(path) && !IsMissing(path, site))
            {
                site.Complaints.Error(entry.Start, $"{Words.Quote(path)} {Help(path, site)}");
            }
        }

        return sources;
    }

    private static string Help(string path, SiteContext site) =>
        site.KnownPaths.Contains(path) ? "is not given in this file, so it has no source; leave the line out"
        : NearestKey.Of(path, site.Paths) is { } nearest ? $"names no value of this file; did you mean {Words.Quote(nearest)}?"
        : "names no value of this file; write the table, the name where there is one, and the key, such as \"well.RW-1.extracts\"";

    private static bool IsMissing(string path, SiteContext site) =>
        site.MissingPaths.Any(missing => path == missing || path.StartsWith($"{missing}.", StringComparison.Ordinal));

    private static IEnumerable<(string Path, TomlEntry Entry)> Flat(string prefix, TomlTable table) =>
        table.Entries.SelectMany(entry => entry.Value is TomlTable inner
            ? Flat($"{prefix}{entry.Key}.", inner)
            : [($"{prefix}{entry.Key}", entry)]);
}
