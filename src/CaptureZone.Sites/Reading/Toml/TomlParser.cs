using Tomlyn;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace CaptureZone.Sites.Reading.Toml;

/// <summary>
/// Parses a file so that one broken line does not hide the mistakes of the others: the first line that is no TOML is complained
/// of and mended as the complaint says, or blanked, and the file is parsed again.
/// </summary>
internal static class TomlParser
{
    /// <summary>With more broken lines than this the file is something else than a site file with slips.</summary>
    private const int MostBrokenLines = 40;

    /// <summary>The root table; null when too much is broken to go on (the complaints say so).</summary>
    /// <param name="complaints">The text, and where complaints go; its text becomes the mended one, line by line the same.</param>
    public static TomlTable? Parse(Complaints complaints)
    {
        HashSet<int> blankedLines = [];
        for (int round = 0; round < MostBrokenLines; round++)
        {
            if (ParseOnce(complaints) is not { } document)
            {
                return null;
            }

            if (SyntaxMistake.First(document, complaints.Source.Text) is not { } mistake)
            {
                return Build(document, complaints, blankedLines);
            }

            complaints.Error(mistake.Offset, mistake.Text);
            if (mistake.MendedLine is not { } line)
            {
                return null;
            }

            int number = complaints.Source.PlaceOf(mistake.LineStart).Line;
            complaints.Settle(number);
            if (line.Length == 0)
            {
                blankedLines.Add(number);
            }

            complaints.Source = complaints.Source.WithLine(mistake.LineStart, line);
        }

        return null;
    }

    private static DocumentSyntax? ParseOnce(Complaints complaints)
    {
        try
        {
            return SyntaxParser.Parse(complaints.Source.Text, "");
        }
        catch (TomlException)
        {
            // The parser throws for one thing only, and without its place: nesting beyond its limit.
            complaints.Error(
                MostNested(complaints.Source.Text), "brackets are nested too deeply here; a site file needs no more than four");
            return null;
        }
    }

    private static int MostNested(string text)
    {
        (int depth, int most, int offset) = (0, 0, 0);
        for (int i = 0; i < text.Length; i++)
        {
            depth += text[i] switch { '[' or '{' => 1, ']' or '}' => -1, _ => 0 };
            (most, offset) = depth > most ? (depth, i) : (most, offset);
        }

        return offset;
    }

    private static TomlTable Build(DocumentSyntax document, Complaints complaints, HashSet<int> blankedLines)
    {
        SourceText source = complaints.Source;
        bool IsDamaged(int start, int end)
        {
            (int first, int last) = (source.PlaceOf(start).Line, source.PlaceOf(end).Line);
            return blankedLines.Any(line => line >= first && (line < last || end >= source.Text.Length));
        }

        TomlTreeBuilder builder = new(complaints, IsDamaged);
        TomlTable root = builder.Build(document, source.Text.Length);
        if (!builder.FoundRepetition && document.Diagnostics.FirstOrDefault() is { } forbidden)
        {
            // What the tree would take, such as a header for a table that dotted keys have made, TOML still forbids.
            complaints.Error(forbidden.Span.Start.Offset, $"this is not TOML: {Words.Short(forbidden.Message)}");
        }

        return root;
    }
}
