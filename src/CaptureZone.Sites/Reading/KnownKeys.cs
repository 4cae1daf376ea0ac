using System.Collections.Immutable;
using CaptureZone.Sites.Reading.Sections;
using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading;

/// <summary>Lists the keys by letting every reader read an empty table and noting what it asks for.</summary>
internal static class KnownKeys
{
    private static readonly (string Name, Action<TableReader> Read)[] Sections =
    [
        ("", root => RootSection.Read(root)),
        ("aquifer", table => AquiferSection.Read(table)),
        ("regional_flow", table => RegionalFlowSection.Read(table)),
        ("well", table => WellSection.Read(table, plumesGiven: true)),
        ("plume", table => PlumeSection.Read(table)),
        ("zones", table => ZonesSection.Read(table)),
        ("report", table => ReportSection.Read(table)),
        ("backdrop", table => BackdropSection.Read(table)),
    ];

    /// <summary>All keys with the names of their tables.</summary>
    public static ImmutableArray<string> All() => [.. Sections.SelectMany(section => Of(section.Name, section.Read))];

    private static IEnumerable<string> Of(string name, Action<TableReader> read)
    {
        SiteContext nowhere = new(new Complaints("", new SourceText("")), new NamedFiles(new NoFiles()));
        TableReader table = new(nowhere, new TomlTable(0, 0), name, name);
        read(table);
        return table.Known.Where(key => !LaterSections.Holds(key)).Select(table.PathOf);
    }
}
