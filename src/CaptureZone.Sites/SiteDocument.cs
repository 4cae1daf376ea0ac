using System.Collections.Immutable;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Sites;

/// <summary>A site file, read and understood; immutable. Everything that an output prints of the input stands here.</summary>
public sealed record SiteDocument
{
    /// <summary>The file's name as the user gave it; "-" for standard input.</summary>
    public required string FileName { get; init; }

    /// <summary>The file's text.</summary>
    public required string Text { get; init; }

    /// <summary>SHA-256 of the file's bytes and of the bytes of every file that it names, in lower-case hexadecimal.</summary>
    public required string Sha256 { get; init; }

    /// <summary>The site's title.</summary>
    public required string Title { get; init; }

    /// <summary>The coordinate system that the file states.</summary>
    public required CoordinateSystem Coordinates { get; init; }

    /// <summary>Between the site's coordinates and the engine's local metres.</summary>
    public required SiteFrame Frame { get; init; }

    /// <summary>What moves the water, in local metres and days.</summary>
    public required Model Model { get; init; }

    /// <summary>What is asked.</summary>
    public required Questions Questions { get; init; }

    /// <summary>The travel times as the file writes them ("5 yr"), in the order of the questions.</summary>
    public required ImmutableArray<string> TravelTimeLabels { get; init; }

    /// <summary>How the report is to be written.</summary>
    public required ReportSettings Report { get; init; }

    /// <summary>Every input with its value, usual range and source, in the order of the file: the memo's Table 1.</summary>
    public required ImmutableArray<InputEntry> Inputs { get; init; }

    /// <summary>What is drawn and never computed with.</summary>
    public required ImmutableArray<Backdrop> Backdrops { get; init; }

    /// <summary>What is legal but unusual, with its place.</summary>
    public required ImmutableArray<Complaint> Warnings { get; init; }
}

/// <summary>Which units a report is written in.</summary>
public enum ReportUnits
{
    /// <summary>m, m/d, m3/d with L/s.</summary>
    Metric,

    /// <summary>ft, ft/d, gpm.</summary>
    Us,
}

/// <summary>The [report] table; an empty text means: not given.</summary>
/// <param name="Units">Units of everything printed.</param>
/// <param name="Project">Project or file number.</param>
/// <param name="PreparedFor">For whom.</param>
/// <param name="PreparedBy">By whom, with licence number if any.</param>
/// <param name="Date">Date as given, ISO 8601; empty when not given (no clock is read).</param>
/// <param name="VerticalDatum">Vertical datum of all elevations.</param>
public sealed record ReportSettings(
    ReportUnits Units, string Project, string PreparedFor, string PreparedBy, string Date, string VerticalDatum);

/// <summary>One input for the memo's Table 1.</summary>
/// <param name="Key">Its key in the file, such as "aquifer.conductivity" or "well.RW-1.extracts".</param>
/// <param name="Label">In words, such as "Hydraulic conductivity".</param>
/// <param name="Written">The value as the file writes it, with its unit ("18 m/d").</param>
/// <param name="Quantity">What kind of quantity it is, so that it can be printed in the report's units.</param>
/// <param name="Value">The value in metres and days; a plain ratio or degrees as given.</param>
/// <param name="UsualRange">Usual range with its source, or empty.</param>
/// <param name="Source">From [sources], or empty: "source not given".</param>
public sealed record InputEntry(
    string Key, string Label, string Written, QuantityKind Quantity, double Value, string UsualRange, string Source);

/// <summary>Kinds of quantities that are printed.</summary>
public enum QuantityKind
{
    /// <summary>A ratio: gradient, porosity, retardation.</summary>
    Ratio,

    /// <summary>Degrees clockwise from grid north.</summary>
    Direction,

    /// <summary>A length or an elevation.</summary>
    Length,

    /// <summary>Hydraulic conductivity.</summary>
    Conductivity,

    /// <summary>Transmissivity, or discharge per unit width.</summary>
    Transmissivity,

    /// <summary>A pumping rate.</summary>
    Rate,

    /// <summary>A time.</summary>
    Time,

    /// <summary>An area.</summary>
    Area,

    /// <summary>A place: printed as written.</summary>
    Place,
}

/// <summary>Something drawn and never computed with.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Shape">Its shape, in local metres: polygon, line or points.</param>
public sealed record Backdrop(string Name, NetTopologySuite.Geometries.Geometry Shape);
