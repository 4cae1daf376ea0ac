namespace CaptureZone.Sites.Reading.Sections;

/// <summary>Reads [report].</summary>
internal static class ReportSection
{
    private static readonly Field Units = new("units", "", "metric");
    private static readonly Field Project = new("project", "", "File 26-118");
    private static readonly Field PreparedFor = new("prepared_for", "", "Town of Larkspur");
    private static readonly Field PreparedBy = new("prepared_by", "", "A. Writer, licence 0000");
    private static readonly Field Date = new("date", "", "2026-12-01");
    private static readonly Field VerticalDatum = new("vertical_datum", "", "NAVD 88");

    /// <summary>How the report is to be written.</summary>
    /// <param name="table">The table.</param>
    public static ReportSettings Read(TableReader table)
    {
        ReportSettings settings = new(
            table.Choice(Units, ("metric", ReportUnits.Metric), ("us", ReportUnits.Us)) ?? ReportUnits.Metric,
            table.Text(Project) ?? "",
            table.Text(PreparedFor) ?? "",
            table.Text(PreparedBy) ?? "",
            table.Date(Date) ?? "",
            table.Text(VerticalDatum) ?? "");
        table.Finish();
        return settings;
    }
}
