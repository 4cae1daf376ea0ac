using System.Collections.Immutable;
using CaptureZone.Sites.Reading.Toml;
using CaptureZone.Sites.Units;

namespace CaptureZone.Sites.Reading;

/// <summary>
/// Reads the values of one table. To ask for a key is to declare it: what nobody asked for is an unknown key, told by
/// <see cref="Finish"/>. A value that cannot be used is complained of here and comes back as null, so that whoever asked
/// says nothing more about it.
/// </summary>
/// <param name="site">What all readers share.</param>
/// <param name="table">The table.</param>
/// <param name="title">How the file writes the table's header, such as "[aquifer]"; "the site file" at the root.</param>
/// <param name="path">The path of its values, such as "aquifer" or "well.RW-1"; empty at the root.</param>
internal sealed partial class TableReader(SiteContext site, TomlTable table, string title, string path)
{
    private readonly List<string> _known = [];
    private readonly List<(string Key, string Text)> _missing = [];

    /// <summary>The keys that were asked for.</summary>
    public IReadOnlyList<string> Known => _known;

    /// <summary>What all readers share.</summary>
    public SiteContext Site => site;

    /// <summary>Whether the file gives a key, usable or not.</summary>
    /// <param name="key">The key.</param>
    public bool Has(string key) => Find(key) is not null;

    /// <summary>Where a key stands; the table's header where it is not given.</summary>
    /// <param name="key">The key.</param>
    public int PlaceOf(string key) => Find(key)?.Value.Start ?? table.Start;

    /// <summary>Adds an error about a key, or about the table where the key is not given.</summary>
    /// <param name="key">The key.</param>
    /// <param name="text">What is wrong and how to mend it.</param>
    public void Error(string key, string text) => site.Complaints.Error(PlaceOf(key), text);

    /// <summary>
    /// Notes that a key is needed and missing. <see cref="Finish"/> tells it, unless a line of the table could not be read or an
    /// unknown key was probably meant for it.
    /// </summary>
    /// <param name="key">The key.</param>
    /// <param name="text">What is missing and how to mend it.</param>
    public void Missing(string key, string text)
    {
        _missing.Add((key, text));
        site.MissingPaths.Add(PathOf(key));
    }

    /// <summary>The path of a key's value.</summary>
    /// <param name="key">The key.</param>
    public string PathOf(string key) => path.Length == 0 ? key : $"{path}.{key}";

    /// <summary>A text that is not empty.</summary>
    /// <param name="field">The key.</param>
    public string? Text(Field field)
    {
        switch (Value(field))
        {
            case null:
                return null;
            case TomlText { Value: var text } when !string.IsNullOrWhiteSpace(text):
                return text;
            case TomlText:
                Error(field.Key, $"{field.Key} is empty; write {field.Key} = \"{field.Example}\", with your own text, or leave it out");
                return null;
            case { } other:
                Error(field.Key, $"{field.Key} must be a text in quotes, such as \"{field.Example}\"; found {Words.KindOf(other)}");
                return null;
        }
    }

    /// <summary>One of a few words.</summary>
    /// <param name="field">The key.</param>
    /// <param name="words">The words and what they stand for.</param>
    public T? Choice<T>(Field field, params (string Word, T Meaning)[] words)
        where T : struct
    {
        if (Text(field) is not { } text)
        {
            return null;
        }

        int index = Array.FindIndex(words, pair => pair.Word == text);
        if (index >= 0)
        {
            return words[index].Meaning;
        }

        string[] all = [.. words.Select(pair => Words.Quote(pair.Word))];
        string list = $"{string.Join(", ", all[..^1])} or {all[^1]}";
        string meant = NearestKey.Of(text, words.Select(pair => pair.Word)) is { } nearest ? $"; did you mean {Words.Quote(nearest)}?" : "";
        Error(field.Key, $"{field.Key} must be {list}; found {Words.Quote(text)}{meant}");
        return null;
    }

    /// <summary>A quantity with its unit, in metres and days.</summary>
    /// <param name="field">The key.</param>
    /// <param name="dimension">What it measures.</param>
    public double? Quantity(Field field, Dimension dimension)
    {
        if (Value(field) is not { } node || QuantityOf(field, dimension, node) is not { } value)
        {
            return null;
        }

        Input(field, KindOf(dimension), ((TomlText)node).Value, value);
        return value;
    }

    /// <summary>A number without a unit: a ratio or degrees.</summary>
    /// <param name="field">The key.</param>
    /// <param name="kind">What it is.</param>
    public double? Number(Field field, QuantityKind kind)
    {
        switch (Value(field))
        {
            case null:
                return null;
            case TomlNumber number when CheckedNumber(field, number) is { } value:
                Input(field, kind, site.Complaints.Source.Of(number), value);
                return value;
            case TomlNumber:
                return null;
            case { } other:
                Error(field.Key, $"{field.Key} must be a number without a unit, such as {field.Example}; found {Words.KindOf(other)}");
                return null;
        }
    }

    /// <summary>A date alone, as it is written.</summary>
    /// <param name="field">The key.</param>
    public string? Date(Field field)
    {
        switch (Value(field))
        {
            case null:
                return null;
            case TomlDate { IsDateAlone: true } date:
                return site.Complaints.Source.Of(date);
            case { } other:
                Error(
                    field.Key,
                    $"{field.Key} must be a date without quotes, such as {field.Key} = {field.Example}; found {Words.KindOf(other)}");
                return null;
        }
    }

    /// <summary>A list of quantities with units, in metres and days, with the texts as written; a bad one is left out.</summary>
    /// <param name="field">The key.</param>
    /// <param name="dimension">What they measure.</param>
    public ImmutableArray<WrittenQuantity> Quantities(Field field, Dimension dimension)
    {
        if (Value(field) is not { } node)
        {
            return [];
        }

        if (node is not TomlArray list)
        {
            Error(field.Key, $"{field.Key} must be a list, such as [\"{field.Example}\"]; found {Words.KindOf(node)}");
            return [];
        }

        return
        [
            .. list.Items
                .Select(item => (item, value: QuantityOf(field, dimension, item)))
                .Where(pair => pair.value is not null)
                .Select(pair => new WrittenQuantity(((TomlText)pair.item).Value, pair.value!.Value, pair.item.Start)),
        ];
    }

    /// <summary>Complains of every key that nobody asked for, and of what is missing. To be called last.</summary>
    public void Finish()
    {
        HashSet<string> meant = [];
        foreach (TomlEntry entry in table.Entries.Where(entry => !_known.Contains(entry.Key)))
        {
            string? nearest = NearestKey.Of(entry.Key, _known);
            meant.Add(nearest ?? "");
            string help = nearest is not null ? $"did you mean {Words.Quote(nearest)}?" : $"it takes {string.Join(", ", _known)}";
            site.Complaints.Error(entry.Start, $"{title} has no key {Words.Quote(entry.Key)}; {help}");
        }

        foreach ((string key, string text) in _missing.Where(missing => !table.IsDamaged && !meant.Contains(missing.Key)))
        {
            site.Complaints.Error(table.Start, text);
        }
    }

    /// <summary>Notes an input for the memo's table.</summary>
    /// <param name="field">The key.</param>
    /// <param name="kind">What kind of quantity it is.</param>
    /// <param name="written">The value as the file writes it.</param>
    /// <param name="value">The value in metres and days.</param>
    public void Input(Field field, QuantityKind kind, string written, double value)
    {
        if (field.Label.Length > 0)
        {
            InputEntry entry = new(PathOf(field.Key), field.Label, written, kind, value, field.Usual?.Words ?? "", "");
            site.Inputs.Add((PlaceOf(field.Key), entry));
        }
    }

    private static QuantityKind KindOf(Dimension dimension) => dimension switch
    {
        Dimension.Length => QuantityKind.Length,
        Dimension.Area => QuantityKind.Area,
        Dimension.Time or Dimension.Resistance => QuantityKind.Time,
        Dimension.Conductivity or Dimension.Recharge => QuantityKind.Conductivity,
        Dimension.Transmissivity => QuantityKind.Transmissivity,
        Dimension.Rate => QuantityKind.Rate,
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };

    private TomlEntry? Find(string key)
    {
        if (!_known.Contains(key))
        {
            _known.Add(key);
            site.KnownPaths.Add(PathOf(key));
        }

        TomlEntry? entry = table.Find(key);
        if (entry is not null)
        {
            site.Paths.Add(PathOf(key));
        }

        return entry;
    }

    /// <summary>The value of a key; null, with a complaint if the table needs it, where it is not given.</summary>
    private TomlNode? Value(Field field)
    {
        TomlEntry? entry = Find(field.Key);
        if (entry is null && field.Required)
        {
            Missing(field.Key, $"{title} lacks {field.Key}; add a line such as {field.Key} = {field.ExampleValue}");
        }

        return entry?.Value;
    }

    private double? QuantityOf(Field field, Dimension dimension, TomlNode node)
    {
        switch (node)
        {
            case TomlNumber number:
                string unit = field.Example[(field.Example.IndexOf(' ', StringComparison.Ordinal) + 1)..];
                site.Complaints.Error(
                    node.Start,
                    $"{field.Key} lacks a unit; write \"{site.Complaints.Source.Of(number)} {unit}\", with the unit that it is in");
                return null;
            case TomlText text:
                if (UnitTable.TryRead(text.Value, dimension, out double value, out string problem))
                {
                    return Checked(field, node, value, Words.Quote(text.Value));
                }

                site.Complaints.Error(node.Start, $"{field.Key}: {problem}");
                return null;
            default:
                site.Complaints.Error(
                    node.Start,
                    $"{field.Key} must be a quantity with its unit in quotes, such as \"{field.Example}\"; found {Words.KindOf(node)}");
                return null;
        }
    }

    private double? CheckedNumber(Field field, TomlNumber number) =>
        Checked(field, number, number.Value, site.Complaints.Source.Of(number));

    private double? Checked(Field field, TomlNode node, double value, string written)
    {
        if (!double.IsFinite(value) || !field.Limit.Holds(value))
        {
            site.Complaints.Error(node.Start, $"{field.Key} = {written} cannot be; it must be {field.Limit.Words}");
            return null;
        }

        WarnIfUnusual(field, node.Start, value, written);
        return value;
    }

    /// <summary>Warns of a value outside the usual range.</summary>
    /// <param name="field">The key.</param>
    /// <param name="offset">Where it stands.</param>
    /// <param name="value">The value in metres and days.</param>
    /// <param name="written">The value as it is shown.</param>
    public void WarnIfUnusual(Field field, int offset, double value, string written)
    {
        if (field.Usual is { } usual && !usual.Holds(value))
        {
            site.Complaints.Warn(offset, $"{field.Key} = {written} is unusual; usual is {usual.Words}");
        }
    }
}

/// <summary>A quantity of a list.</summary>
/// <param name="Written">As the file writes it.</param>
/// <param name="Value">In metres and days.</param>
/// <param name="Offset">Where it stands.</param>
internal sealed record WrittenQuantity(string Written, double Value, int Offset);
