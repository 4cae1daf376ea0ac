using System.Collections.Immutable;
using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading;

/// <summary>Gathers what is wrong or unusual in one file.</summary>
/// <param name="file">The file's name, as the user gave it.</param>
/// <param name="source">Its text.</param>
internal sealed class Complaints(string file, SourceText source)
{
    private readonly List<Complaint> _all = [];
    private readonly HashSet<int> _settledLines = [];

    /// <summary>The text that is complained of; while lines are mended, each complaint keeps the place that it had.</summary>
    public SourceText Source { get; set; } = source;

    /// <summary>Whether one of them is an error.</summary>
    public bool HasErrors => _all.Exists(complaint => complaint.Severity == Severity.Error);

    /// <summary>Adds an error.</summary>
    /// <param name="offset">Where in the text.</param>
    /// <param name="text">What is wrong and how to mend it.</param>
    public void Error(int offset, string text) => Add(offset, Severity.Error, text);

    /// <summary>Adds a warning.</summary>
    /// <param name="offset">Where in the text.</param>
    /// <param name="text">What is unusual.</param>
    public void Warn(int offset, string text) => Add(offset, Severity.Warning, text);

    /// <summary>Says no more about a line: what else seems wrong with it comes of guessing what was meant.</summary>
    /// <param name="line">The line, from 1.</param>
    public void Settle(int line) => _settledLines.Add(line);

    /// <summary>All of them in the order of the file.</summary>
    public ImmutableArray<Complaint> InOrder() => [.. _all.OrderBy(complaint => complaint.Line).ThenBy(complaint => complaint.Column)];

    private void Add(int offset, Severity severity, string text)
    {
        (int line, int column) = Source.PlaceOf(offset);
        if (!_settledLines.Contains(line))
        {
            _all.Add(new Complaint(file, line, column, severity, text));
        }
    }
}
