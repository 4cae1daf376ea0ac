using CaptureZone.Sites;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace CaptureZone.Jobs;

/// <summary>Where a well's rate stands in a site file.</summary>
internal static class WellPlaces
{
    /// <summary>Line and column, from 1, of a well's rate.</summary>
    /// <param name="site">A site that was read from its text without an error.</param>
    /// <param name="well">Index of the well: its place among the file's wells.</param>
    public static (int Line, int Column) Of(SiteDocument site, int well)
    {
        TableArraySyntax table = SyntaxParser.Parse(site.Text, site.FileName).Tables
            .OfType<TableArraySyntax>()
            .Where(entry => entry.Name?.ToString().Trim() == "well")
            .ElementAt(well);
        SyntaxNode place = table.Items.FirstOrDefault(item => item.Key?.ToString().Trim() == "extracts")?.Value ?? (SyntaxNode)table;
        return (place.Span.Start.Line + 1, place.Span.Start.Column + 1);
    }
}
