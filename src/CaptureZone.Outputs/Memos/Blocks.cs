using System.Collections.Immutable;

namespace CaptureZone.Outputs.Memos;

/// <summary>A piece of a memo, in the order in which it is read; texts are plain and may hold any character.</summary>
public abstract record Block;

/// <summary>How a paragraph is meant.</summary>
public enum Tone
{
    /// <summary>Running text.</summary>
    Plain,

    /// <summary>What the calculation predicts.</summary>
    Verdict,

    /// <summary>What the reader must know first.</summary>
    Warning,

    /// <summary>What the memo is not.</summary>
    Caution,
}

/// <summary>A heading.</summary>
/// <param name="Level">1 for a section, 2 inside a section.</param>
/// <param name="Text">Its text, without a number.</param>
public sealed record Heading(int Level, string Text) : Block
{
    /// <summary>Its number, such as "3."; empty for none.</summary>
    public string Number { get; init; } = "";

    /// <summary>Whether sections are counted here: an appendix and headings inside a section are not.</summary>
    public bool IsCounted { get; init; } = Level == 1;

    /// <summary>Whether it starts a new page.</summary>
    public bool StartsPage { get; init; }
}

/// <summary>A paragraph.</summary>
/// <param name="Text">Its text.</param>
/// <param name="Tone">How it is meant.</param>
public sealed record Paragraph(string Text, Tone Tone = Tone.Plain) : Block;

/// <summary>A list of points.</summary>
/// <param name="Items">The points.</param>
public sealed record Bullets(ImmutableArray<string> Items) : Block;

/// <summary>A column of a table.</summary>
/// <param name="Header">Its header, unit included.</param>
/// <param name="Width">Its width beside the other columns', in any one measure.</param>
/// <param name="IsNumeric">Whether it holds numbers, which are set flush right.</param>
public sealed record Column(string Header, double Width, bool IsNumeric = false);

/// <summary>A table with a header and a caption.</summary>
public sealed record Table : Block
{
    /// <summary>States the table.</summary>
    /// <param name="caption">What it shows, without its number.</param>
    /// <param name="columns">Its columns.</param>
    /// <param name="rows">Its rows, each with as many cells as there are columns.</param>
    /// <exception cref="ArgumentException">A row has another number of cells.</exception>
    public Table(string caption, ImmutableArray<Column> columns, ImmutableArray<ImmutableArray<string>> rows)
    {
        if (rows.Any(row => row.Length != columns.Length))
        {
            throw new ArgumentException("Every row has as many cells as the header.", nameof(rows));
        }

        (Caption, Columns, Rows) = (caption, columns, rows);
    }

    /// <summary>What it shows, without its number.</summary>
    public string Caption { get; }

    /// <summary>Its columns.</summary>
    public ImmutableArray<Column> Columns { get; }

    /// <summary>Its rows.</summary>
    public ImmutableArray<ImmutableArray<string>> Rows { get; }

    /// <summary>Its number among the tables; 0 before they are counted.</summary>
    public int Number { get; init; }
}

/// <summary>A picture that lies beside the memo.</summary>
/// <param name="Caption">What it shows, without its number.</param>
/// <param name="AlternativeText">The same for who cannot see it.</param>
/// <param name="File">Its file's name.</param>
public sealed record Figure(string Caption, string AlternativeText, string File) : Block
{
    /// <summary>Its number among the figures; 0 before they are counted.</summary>
    public int Number { get; init; }
}

/// <summary>A line of a form.</summary>
/// <param name="Label">What belongs there.</param>
/// <param name="Value">What stands there; empty: a line to be filled in by hand.</param>
public sealed record FormLine(string Label, string Value);

/// <summary>A form: particulars, or lines to be signed.</summary>
/// <param name="Lines">Its lines.</param>
public sealed record Form(ImmutableArray<FormLine> Lines) : Block;

/// <summary>Text that is shown letter by letter, in its own lines.</summary>
/// <param name="Text">The text.</param>
public sealed record CodeText(string Text) : Block;
