using System.Collections.Immutable;
using System.Text;

namespace CaptureZone.Jobs.Tables;

/// <summary>One field of a table with its place.</summary>
/// <param name="Text">Its text, without quotes and outer blanks.</param>
/// <param name="Line">Line where it begins, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
public readonly record struct CsvField(string Text, int Line, int Column);

/// <summary>Splits comma-separated values (RFC 4180) into rows of fields that know their places; blank lines are left out.</summary>
internal ref struct CsvRows
{
    private const char EndOfText = '\0';

    private readonly ReadOnlySpan<char> _text;
    private int _at;
    private int _line = 1;
    private int _lineStart;

    private CsvRows(ReadOnlySpan<char> text) => _text = text;

    private readonly char Next => _at < _text.Length ? _text[_at] : EndOfText;

    private readonly bool AtLineEnd => _at >= _text.Length || Next is '\n' or '\r';

    /// <summary>The rows of a text.</summary>
    /// <param name="text">The text.</param>
    public static ImmutableArray<ImmutableArray<CsvField>> Of(ReadOnlySpan<char> text)
    {
        ImmutableArray<ImmutableArray<CsvField>>.Builder rows = ImmutableArray.CreateBuilder<ImmutableArray<CsvField>>();
        CsvRows reader = new(text);
        while (reader._at < text.Length)
        {
            ImmutableArray<CsvField> row = reader.Row();
            if (row.Any(field => field.Text.Length > 0))
            {
                rows.Add(row);
            }
        }

        return rows.ToImmutable();
    }

    private ImmutableArray<CsvField> Row()
    {
        ImmutableArray<CsvField>.Builder fields = ImmutableArray.CreateBuilder<CsvField>();
        fields.Add(Field());
        while (Next == ',')
        {
            _at++;
            fields.Add(Field());
        }

        PassLineEnd();
        return fields.ToImmutable();
    }

    private CsvField Field()
    {
        while (Next is ' ' or '\t')
        {
            _at++;
        }

        int line = _line, column = _at - _lineStart + 1;
        StringBuilder text = new();
        if (Next == '"')
        {
            Quoted(text);
        }

        while (!AtLineEnd && Next != ',')
        {
            text.Append(_text[_at++]);
        }

        return new CsvField(text.ToString().Trim(), line, column);
    }

    private void Quoted(StringBuilder text)
    {
        _at++;
        while (_at < _text.Length)
        {
            char c = _text[_at++];
            if (c == '"' && Next != '"')
            {
                return;
            }

            if (c == '"')
            {
                _at++;
            }

            text.Append(c);
            if (c == '\n')
            {
                StartLine();
            }
        }
    }

    private void PassLineEnd()
    {
        if (Next == '\r')
        {
            _at++;
        }

        if (Next == '\n')
        {
            _at++;
        }

        StartLine();
    }

    private void StartLine()
    {
        _line++;
        _lineStart = _at;
    }
}
