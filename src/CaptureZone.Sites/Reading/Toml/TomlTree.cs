using System.Collections.Immutable;

namespace CaptureZone.Sites.Reading.Toml;

/// <summary>A value of a TOML file with its place.</summary>
/// <param name="Start">Offset of its first character.</param>
/// <param name="End">Offset of its last character.</param>
internal abstract record TomlNode(int Start, int End);

/// <summary>A text.</summary>
internal sealed record TomlText(int Start, int End, string Value) : TomlNode(Start, End);

/// <summary>A number; infinite and NaN as TOML allows them.</summary>
internal sealed record TomlNumber(int Start, int End, double Value, bool IsInteger) : TomlNode(Start, End);

/// <summary>True or false.</summary>
internal sealed record TomlBoolean(int Start, int End) : TomlNode(Start, End);

/// <summary>A date, or a time, or both.</summary>
internal sealed record TomlDate(int Start, int End, bool IsDateAlone) : TomlNode(Start, End);

/// <summary>A list.</summary>
internal sealed record TomlArray(int Start, int End, ImmutableArray<TomlNode> Items) : TomlNode(Start, End);

/// <summary>A table: <c>[name]</c>, one of <c>[[name]]</c>, or <c>{ ... }</c>. It grows while the tree is built and never after.</summary>
internal sealed record TomlTable(int Start, int End) : TomlNode(Start, End)
{
    private readonly List<TomlEntry> _entries = [];

    /// <summary>Keys and values in the order of the file.</summary>
    public IReadOnlyList<TomlEntry> Entries => _entries;

    /// <summary>Whether a header of its own has named it, so that another one is a repetition.</summary>
    public bool HasHeader { get; set; }

    /// <summary>Whether a line of it could not be read, so that what seems to be missing may stand there.</summary>
    public bool IsDamaged { get; set; }

    /// <summary>The entry of a key, or null.</summary>
    /// <param name="key">The key.</param>
    public TomlEntry? Find(string key) => _entries.Find(entry => entry.Key == key);

    /// <summary>Adds an entry.</summary>
    /// <param name="entry">The entry.</param>
    public void Add(TomlEntry entry) => _entries.Add(entry);
}

/// <summary>The tables of <c>[[name]]</c>.</summary>
internal sealed record TomlTables(int Start, int End) : TomlNode(Start, End)
{
    /// <summary>The tables in the order of the file.</summary>
    public List<TomlTable> Items { get; } = [];
}

/// <summary>A key with its value.</summary>
/// <param name="Key">The key.</param>
/// <param name="Start">Offset of the key.</param>
/// <param name="Value">The value.</param>
internal sealed record TomlEntry(string Key, int Start, TomlNode Value);
