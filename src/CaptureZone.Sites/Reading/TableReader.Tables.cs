using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading;

/// <summary>Tables within a table.</summary>
internal sealed partial class TableReader
{
    /// <summary>The table of which a site has one, <c>[name]</c>; null when it is not given.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="required">Whether a site cannot do without it.</param>
    public TableReader? One(string name, bool required = false) =>
        Raw(name, required) is { } inner ? new TableReader(site, inner, $"[{name}]", PathOf(name)) : null;

    /// <summary>A table that is not given, for readers whose keys are all optional.</summary>
    /// <param name="name">Its name.</param>
    public TableReader Nothing(string name) => new(site, new TomlTable(table.Start, table.End), $"[{name}]", PathOf(name));

    /// <summary>The tree of a table of which a site has one; null when it is not given.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="required">Whether a site cannot do without it.</param>
    public TomlTable? Raw(string name, bool required = false)
    {
        TomlEntry? entry = Find(name);
        switch (entry?.Value)
        {
            case TomlTable inner:
                return inner;
            case null:
                if (required)
                {
                    Missing(name, $"{title} lacks the table [{name}]");
                }

                return null;
            default:
                site.MissingPaths.Add(PathOf(name));
                ErrorAtKey(name, $"{name} must be a table, written once as [{name}]; found {Described(entry.Value)}");
                return null;
        }
    }

    /// <summary>The tables of which a site has any number, <c>[[name]]</c>.</summary>
    /// <param name="name">Their name.</param>
    /// <param name="namesDiffer">Whether each must have a name of its own.</param>
    public IReadOnlyList<TableReader> Many(string name, bool namesDiffer = false)
    {
        TomlTable[] tables;
        switch (Find(name)?.Value)
        {
            case null:
                return [];
            case TomlTables many:
                tables = [.. many.Items];
                break;
            case TomlArray list when list.Items.All(item => item is TomlTable):
                tables = [.. list.Items.Cast<TomlTable>()];
                break;
            case { } other:
                site.MissingPaths.Add(PathOf(name));
                ErrorAtKey(name, $"{name} must be written [[{name}]], once for each; found {Described(other)}");
                return [];
        }

        if (namesDiffer)
        {
            CheckNames(name, tables);
        }

        string PathOfItem(int index) => $"{PathOf(name)}.{NameOf(tables[index])?.Value ?? Words.Number(index + 1)}";
        return [.. tables.Select((inner, index) => new TableReader(site, inner, $"[[{name}]]", PathOfItem(index)))];
    }

    /// <summary>Adds an error at a key, rather than at its value.</summary>
    /// <param name="key">The key.</param>
    /// <param name="text">What is wrong and how to mend it.</param>
    public void ErrorAtKey(string key, string text) => site.Complaints.Error(Find(key)?.Start ?? table.Start, text);

    private void CheckNames(string kind, TomlTable[] tables)
    {
        Dictionary<string, TomlText> first = new(StringComparer.Ordinal);
        foreach (TomlText name in tables.Select(NameOf).OfType<TomlText>())
        {
            if (!first.TryAdd(name.Value, name))
            {
                string line = Words.Number(site.Complaints.Source.PlaceOf(first[name.Value].Start).Line);
                site.Complaints.Error(
                    name.Start,
                    $"the name {Words.Quote(name.Value)} is already taken on line {line}; every [[{kind}]] needs a name of its own");
            }
        }
    }

    private static TomlText? NameOf(TomlTable table) => table.Find("name")?.Value as TomlText;

    private static string Described(TomlNode node) => node switch
    {
        TomlTables => "double brackets",
        TomlTable => "single brackets",
        _ => Words.KindOf(node),
    };
}
