using System.Collections.Immutable;

namespace CaptureZone.Sites;

/// <summary>How serious a complaint is.</summary>
public enum Severity
{
    /// <summary>Legal but unusual.</summary>
    Warning,

    /// <summary>The site cannot be computed.</summary>
    Error,
}

/// <summary>Something wrong or unusual in a site file, with its place.</summary>
/// <param name="File">The file.</param>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
/// <param name="Severity">How serious.</param>
/// <param name="Text">What was found, what is expected, how to mend it; one line.</param>
public sealed record Complaint(string File, int Line, int Column, Severity Severity, string Text)
{
    /// <summary>The complaint in the GNU form, <c>site.toml:12:9: error: ...</c>.</summary>
    public override string ToString() =>
        string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{File}:{Line}:{Column}: {(Severity == Severity.Error ? "error" : "warning")}: {Text}");
}

/// <summary>What reading a site file gave: a document, or complaints with at least one error among them.</summary>
/// <param name="Document">The document; null when there is an error.</param>
/// <param name="Complaints">Everything wrong or unusual, in the file's order.</param>
public sealed record SiteReading(SiteDocument? Document, ImmutableArray<Complaint> Complaints);
