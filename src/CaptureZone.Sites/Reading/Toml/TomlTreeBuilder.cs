using Tomlyn;
using Tomlyn.Syntax;

namespace CaptureZone.Sites.Reading.Toml;

/// <summary>
/// Builds the tree of a file from its syntax. What is given twice is a complaint, and the later one is left out, with
/// everything under it.
/// </summary>
/// <param name="complaints">Where complaints go.</param>
/// <param name="isDamaged">Whether a line between two offsets could not be read.</param>
internal sealed class TomlTreeBuilder(Complaints complaints, Func<int, int, bool> isDamaged)
{
    /// <summary>Whether something was given twice.</summary>
    public bool FoundRepetition { get; private set; }

    /// <summary>The root table of a file.</summary>
    /// <param name="document">Its syntax.</param>
    /// <param name="length">Length of its text.</param>
    public TomlTable Build(DocumentSyntax document, int length)
    {
        TableSyntaxBase[] tables = [.. document.Tables];
        int EndOf(int index) => index < tables.Length ? tables[index].Span.Start.Offset : length;

        TomlTable root = new(0, 0) { HasHeader = true, IsDamaged = isDamaged(0, EndOf(0)) };
        AddAll(root, document.KeyValues);
        for (int i = 0; i < tables.Length; i++)
        {
            int start = tables[i].Span.Start.Offset;
            TomlTable table = Open(root, tables[i]);
            table.IsDamaged |= isDamaged(start, EndOf(i + 1));
            AddAll(table, tables[i].Items);
        }

        return root;
    }

    private TomlTable Open(TomlTable root, TableSyntaxBase header)
    {
        TomlTable fresh = new(header.Span.Start.Offset, header.Span.End.Offset) { HasHeader = true };
        if (header.Name is null || Descend(root, header.Name) is not { } parent)
        {
            return fresh;
        }

        (string key, int at) = Parts(header.Name)[^1];
        bool many = header is TableArraySyntax;
        TomlNode? present = parent.Find(key)?.Value;
        switch (present)
        {
            case null when many:
                TomlTables tables = new(fresh.Start, fresh.End);
                tables.Items.Add(fresh);
                parent.Add(new TomlEntry(key, at, tables));
                return fresh;
            case null:
                parent.Add(new TomlEntry(key, at, fresh));
                return fresh;
            case TomlTables more when many:
                more.Items.Add(fresh);
                return fresh;
            case TomlTable { HasHeader: false } open when !many:
                open.HasHeader = true;
                return open;
            case TomlTable when many:
            case TomlTables when !many:
                FoundRepetition = true;
                complaints.Error(at, $"{Words.Quote(key)} has other brackets on line {LineOf(present)}; write its headers the same way");
                return fresh;
            default:
                Repeated(key, at, present);
                return fresh;
        }
    }

    private void AddAll(TomlTable table, IEnumerable<KeyValueSyntax> pairs)
    {
        foreach (KeyValueSyntax pair in pairs)
        {
            if (pair.Key is null || pair.Value is null || Descend(table, pair.Key) is not { } parent)
            {
                continue;
            }

            (string key, int at) = Parts(pair.Key)[^1];
            if (parent.Find(key) is { } present)
            {
                Repeated(key, at, present.Value);
            }
            else if (NodeOf(pair.Value) is { } value)
            {
                parent.Add(new TomlEntry(key, at, value));
            }
        }
    }

    /// <summary>The table that holds the last part of a dotted key; null where a part of it is already something else.</summary>
    private TomlTable? Descend(TomlTable from, KeySyntax name)
    {
        TomlTable table = from;
        foreach ((string key, int at) in Parts(name)[..^1])
        {
            switch (table.Find(key)?.Value)
            {
                case null:
                    TomlTable child = new(at, at);
                    table.Add(new TomlEntry(key, at, child));
                    table = child;
                    break;
                case TomlTable inner:
                    table = inner;
                    break;
                case TomlTables many:
                    table = many.Items[^1];
                    break;
                case { } other:
                    Repeated(key, at, other);
                    return null;
            }
        }

        return table;
    }

    private TomlNode? NodeOf(ValueSyntax syntax)
    {
        (int start, int end) = (syntax.Span.Start.Offset, syntax.Span.End.Offset);
        return syntax switch
        {
            StringValueSyntax text => new TomlText(start, end, text.Value ?? ""),
            IntegerValueSyntax integer => new TomlNumber(start, end, integer.Value, IsInteger: true),
            FloatValueSyntax number => new TomlNumber(start, end, number.Value, IsInteger: false),
            BooleanValueSyntax => new TomlBoolean(start, end),
            DateTimeValueSyntax date => new TomlDate(start, end, date.Value.Kind == TomlDateTimeKind.LocalDate),
            ArraySyntax array => new TomlArray(
                start, end, [.. array.Items.Select(item => item.Value is { } value ? NodeOf(value) : null).OfType<TomlNode>()]),
            InlineTableSyntax inline => Inline(inline, start, end),
            _ => null,
        };
    }

    private TomlTable Inline(InlineTableSyntax syntax, int start, int end)
    {
        TomlTable table = new(start, end) { HasHeader = true };
        AddAll(table, syntax.Items.Select(item => item.KeyValue).OfType<KeyValueSyntax>());
        return table;
    }

    private void Repeated(string key, int at, TomlNode present)
    {
        FoundRepetition = true;
        complaints.Error(at, $"{Words.Quote(key)} is already given on line {LineOf(present)}; keep one of the two");
    }

    private string LineOf(TomlNode node) => Words.Number(complaints.Source.PlaceOf(node.Start).Line);

    private static List<(string Key, int At)> Parts(KeySyntax name)
    {
        List<(string, int)> parts = [Part(name.Key)];
        parts.AddRange(name.DotKeys.Select(dotted => Part(dotted.Key)));
        return parts;
    }

    private static (string, int) Part(BareKeyOrStringValueSyntax? syntax) => syntax switch
    {
        BareKeySyntax bare => (bare.Key?.Text ?? "", bare.Span.Start.Offset),
        StringValueSyntax text => (text.Value ?? "", text.Span.Start.Offset),
        _ => ("", 0),
    };
}
