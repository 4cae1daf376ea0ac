using System.Text;

namespace CaptureZone.Sites.Coordinates;

/// <summary>Parses well-known text into nodes; knows brackets and quotes and nothing of what they mean.</summary>
/// <param name="text">The text.</param>
internal sealed class WktParser(string text)
{
    /// <summary>Nodes inside nodes: definitions have four or five levels; the limit guards the stack against a hostile file.</summary>
    private const int DeepestNode = 16;

    private int _at;

    /// <summary>The node that the whole text is; null when it is not well-known text or more than one node.</summary>
    /// <param name="text">The text.</param>
    public static WktNode? Parse(string text)
    {
        var parser = new WktParser(text);
        WktNode? node = parser.Node(parser.Word(), 0);
        parser.SkipSpace();
        return parser._at == text.Length ? node : null;
    }

    private WktNode? Node(string keyword, int depth)
    {
        if (keyword.Length == 0 || depth > DeepestNode || !(Take('[') || Take('(')))
        {
            return null;
        }

        var values = new List<string>();
        var nodes = new List<WktNode>();
        do
        {
            if (!TakeArgument(values, nodes, depth))
            {
                return null;
            }
        }
        while (Take(','));
        return Take(']') || Take(')') ? new WktNode(keyword.ToUpperInvariant(), [.. values], [.. nodes]) : null;
    }

    private bool TakeArgument(List<string> values, List<WktNode> nodes, int depth)
    {
        string? value = Take('"') ? Quoted() : null;
        string word = value is null ? Word() : string.Empty;
        if (value is null && (Sees('[') || Sees('(')))
        {
            return Added(Node(word, depth + 1), nodes);
        }

        return Added(value ?? (word.Length > 0 ? word : null), values);
    }

    private static bool Added<T>(T? item, List<T> items)
        where T : class
    {
        if (item is not null)
        {
            items.Add(item);
        }

        return item is not null;
    }

    /// <summary>A keyword, a number or a bare word.</summary>
    private string Word()
    {
        SkipSpace();
        int start = _at;
        while (_at < text.Length && (char.IsAsciiLetterOrDigit(text[_at]) || text[_at] is '_' or '.' or '+' or '-'))
        {
            _at++;
        }

        return text[start.._at];
    }

    /// <summary>The rest of a quoted text, in which a doubled quote stands for one; null when it does not end.</summary>
    private string? Quoted()
    {
        var content = new StringBuilder();
        while (_at < text.Length)
        {
            char c = text[_at++];
            if (c != '"')
            {
                content.Append(c);
            }
            else if (_at < text.Length && text[_at] == '"')
            {
                content.Append(text[_at++]);
            }
            else
            {
                return content.ToString();
            }
        }

        return null;
    }

    private bool Sees(char c)
    {
        SkipSpace();
        return _at < text.Length && text[_at] == c;
    }

    private bool Take(char c)
    {
        bool sees = Sees(c);
        _at += sees ? 1 : 0;
        return sees;
    }

    private void SkipSpace()
    {
        while (_at < text.Length && char.IsWhiteSpace(text[_at]))
        {
            _at++;
        }
    }
}
