namespace CaptureZone.Outputs.Maps;

/// <summary>One map in two formats.</summary>
/// <param name="Png">A PNG file, 2600 pixels wide.</param>
/// <param name="Svg">An SVG file in UTF-8 that needs no font on the viewer's machine.</param>
public sealed record MapPictures(byte[] Png, byte[] Svg);

/// <summary>The plan: predicted heads, zones, plumes and wells. Its look is that of <c>docs/look.md</c>.</summary>
public static class PlanMap
{
    /// <summary>Draws the map of a report; the same bytes on every machine and in every culture.</summary>
    /// <param name="report">Document and answers.</param>
    public static MapPictures Draw(Report report)
    {
        MapSheet sheet = new(report);
        using PngCanvas png = new((int)Look.SheetWidth, sheet.Height);
        SvgCanvas svg = new((int)Look.SheetWidth, sheet.Height, $"{report.Site.Title}: predicted heads and zones");
        sheet.Draw(png);
        sheet.Draw(svg);
        return new MapPictures(png.ToFile(), svg.ToFile());
    }
}
