using System.Text.RegularExpressions;
using Tomlyn.Syntax;

namespace CaptureZone.Sites.Reading.Toml;

/// <summary>A line that is no TOML, in plain words.</summary>
/// <param name="LineStart">Where the line begins.</param>
/// <param name="Offset">Where the mistake is.</param>
/// <param name="Text">What is wrong and how to mend it.</param>
/// <param name="MendedLine">The line as it was probably meant; empty to pass over it; null when nothing after it can be judged.</param>
internal sealed partial record SyntaxMistake(int LineStart, int Offset, string Text, string? MendedLine)
{
    /// <summary>The first one of a file; null when all of it is TOML. Repetitions are found later, with both their places.</summary>
    /// <param name="document">The syntax of the file.</param>
    /// <param name="text">Its text.</param>
    public static SyntaxMistake? First(DocumentSyntax document, string text)
    {
        DiagnosticMessage? first = document.Diagnostics
            .Where(message => !message.Message.Contains("is already defined at", StringComparison.Ordinal))
            .MinBy(message => message.Span.Start.Offset);
        if (first is null)
        {
            return null;
        }

        int found = Math.Min(first.Span.Start.Offset, text.Length);
        int? open = OpenListBefore(document, text, found);
        int offset = open ?? found;
        int start = StartOfLine(text, offset);
        int end = text.IndexOf('\n', start);
        string line = text[start..(end < 0 ? text.Length : end)].TrimEnd('\r');
        string parserSays = TokenName().Replace(first.Message, "").Replace("\u2424", "the end of the line", StringComparison.Ordinal);
        return open is null ? Explain(line, start, offset, parserSays) : OpenList(line, start, offset);
    }

    /// <summary>Where a list begins that is still open when the next line, or the end of the file, shows that it should not be.</summary>
    private static int? OpenListBefore(DocumentSyntax document, string text, int offset)
    {
        bool beginsLine = offset == text.Length || string.IsNullOrWhiteSpace(text[StartOfLine(text, offset)..offset]);
        ArraySyntax? open = document.Descendants().OfType<ArraySyntax>().LastOrDefault(array => array.CloseBracket is null);
        return beginsLine ? open?.Span.Start.Offset : null;
    }

    private static int StartOfLine(string text, int offset) => offset == 0 ? 0 : text.LastIndexOf('\n', offset - 1) + 1;

    private static SyntaxMistake OpenList(string line, int start, int offset)
    {
        // A list that goes on over lines may end anywhere; one that breaks off after a value ends there.
        bool endsHere = OneLineList().Match(line) is { Success: true };
        return new(
            start,
            offset,
            "the list that begins here is not closed; put ] at its end",
            endsHere ? line + new string(']', line.Count(c => c == '[') - line.Count(c => c == ']')) : null);
    }

    private static SyntaxMistake Explain(string line, int start, int offset, string parserSays)
    {
        if (HeaderLine().Match(line) is { Success: true } header)
        {
            Group open = header.Groups["open"];
            string close = open.Value == "[[" ? "]]" : "]";
            string mended = $"{open.Value}{header.Groups["name"].Value}{close}";
            return new(start, start + open.Index, $"the header is not closed; write {mended}", mended);
        }

        if (KeyLine().Match(line) is { Success: true } pair)
        {
            return ExplainPair(pair, start, offset, parserSays);
        }

        // Without its header, the keys of a table would seem to belong to the table before.
        return new(start, offset, $"this is not TOML: {Words.Short(parserSays)}", MaybeHeader().IsMatch(line) ? null : "");
    }

    private static SyntaxMistake ExplainPair(Match pair, int start, int offset, string parserSays)
    {
        string key = pair.Groups["key"].Value;
        string value = pair.Groups["value"].Value;
        Group sign = pair.Groups["sign"];
        SyntaxMistake Mended(string words, string better) =>
            new(start, start + pair.Groups["value"].Index, words, $"{key} = {better}");
        SyntaxMistake Blanked(string words) => new(start, offset, words, "");

        if (sign.Value == ":")
        {
            string words = $"a key and its value are parted by \"=\", not \":\"; write {key} = {Words.Short(value)}";
            return new(start, start + sign.Index, words, $"{key} = {value}");
        }

        string numeral = value.Replace(',', '.');
        string fraction = value.Replace(".", "0.", StringComparison.Ordinal);
        string trimmed = LeadingZero().Replace(value, "");
        return value switch
        {
            "" => Blanked($"{key} has no value; write one after \"=\", or leave the line out"),
            _ when OpenText().IsMatch(value) => Mended($"the text is not closed; put {value[0]} at its end", value + value[0]),
            _ when value[0] is '"' or '\'' => Blanked($"the text of {key} is not a TOML text: {Words.Short(parserSays)}"),
            _ when value[0] is '[' or '{' => Blanked($"the value of {key} is not TOML: {Words.Short(parserSays)}"),
            _ when Date().IsMatch(value) => Blanked($"{Words.Short(value)} is no date of the calendar"),
            _ when DecimalComma().IsMatch(value) => Mended($"{value} has a comma; decimals are written with a point: {numeral}", numeral),
            _ when NoZero().IsMatch(value) => Mended($"{value} needs a digit before its point; write {fraction}", fraction),
            _ when LeadingZero().IsMatch(value) => Mended($"{value} begins with a zero too many; write {trimmed}", trimmed),
            _ => Mended($"{Words.Short(value)} must stand in quotes; write {key} = {Words.Quote(value)}", InQuotes(value)),
        };
    }

    private static string InQuotes(string value) =>
        $"\"{value.Replace("\\", "\\\\", StringComparison.Ordinal).Replace("\"", "\\\"", StringComparison.Ordinal)}\"";

    [GeneratedRegex(@" \(token: \S+?\)", RegexOptions.CultureInvariant)]
    private static partial Regex TokenName();

    [GeneratedRegex(@"^\s*(?<open>\[\[?)(?<name>[A-Za-z0-9_-]+)\]?\s*(#.*)?$", RegexOptions.CultureInvariant)]
    private static partial Regex HeaderLine();

    [GeneratedRegex(@"^[^=,]*\[\s*[^\d\s+\[-][^=,]*$|^[^=,]*\[\[[^=,]*$", RegexOptions.CultureInvariant)]
    private static partial Regex MaybeHeader();

    [GeneratedRegex(
        @"^\s*(?<key>[A-Za-z0-9_.-]+|""[^""]*"")\s*(?<sign>[=:])\s*(?<value>(""[^""]*""|[^#""])*?(""[^""]*)?)\s*(#.*)?$",
        RegexOptions.CultureInvariant)]
    private static partial Regex KeyLine();

    [GeneratedRegex(@"=\s*\[.*[\d""\]]\s*$", RegexOptions.CultureInvariant)]
    private static partial Regex OneLineList();

    [GeneratedRegex(@"^(""[^""\\]*|'[^']*)$", RegexOptions.CultureInvariant)]
    private static partial Regex OpenText();

    [GeneratedRegex(@"^\d{4}-\d\d-\d\d", RegexOptions.CultureInvariant)]
    private static partial Regex Date();

    [GeneratedRegex(@"^[+-]?\d+,\d+$", RegexOptions.CultureInvariant)]
    private static partial Regex DecimalComma();

    [GeneratedRegex(@"^[+-]?\.\d+$", RegexOptions.CultureInvariant)]
    private static partial Regex NoZero();

    [GeneratedRegex(@"(?<=^[+-]?)0+(?=\d)", RegexOptions.CultureInvariant)]
    private static partial Regex LeadingZero();
}
