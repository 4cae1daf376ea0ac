using System.Globalization;
using CaptureZone.Sites;
using CaptureZone.Sites.Units;

namespace CaptureZone.Outputs.Text;

/// <summary>
/// Prints quantities in a report's units, in one way for every page, map and table. Engine values go in (metres, days, square
/// metres, m3/d); the text is the same in every culture.
/// </summary>
/// <param name="units">The report's units.</param>
public sealed class Printer(ReportUnits units)
{
    /// <summary>What stands for a value that does not exist.</summary>
    public const string None = "none";

    /// <summary>What stands for a value that is no number.</summary>
    public const string NotANumber = "-";

    /// <summary>Significant figures of computed values: field data support no more (common practice, no source).</summary>
    private const int ComputedFigures = 3;

    /// <summary>Significant figures of values that were entered, so that a change of unit loses nothing of them.</summary>
    private const int EnteredFigures = 5;

    /// <summary>Decimals of a share in per cent.</summary>
    private const int PercentDecimals = 1;

    /// <summary>Times from here on print in years, d.</summary>
    private static readonly double LongTime = 2 * Factor("yr");

    private bool Us => units == ReportUnits.Us;

    /// <summary>A value in the unit that <see cref="Unit"/> names.</summary>
    /// <param name="kind">What kind of quantity.</param>
    /// <param name="value">The value in metres and days.</param>
    public double In(QuantityKind kind, double value) =>
        kind is QuantityKind.Ratio or QuantityKind.Direction or QuantityKind.Place ? value : value / Factor(Unit(kind));

    /// <summary>The unit of a kind of quantity, for the head of a column; empty where there is none.</summary>
    /// <param name="kind">What kind of quantity.</param>
    public string Unit(QuantityKind kind) => kind switch
    {
        QuantityKind.Direction => "degrees",
        QuantityKind.Length => Us ? "ft" : "m",
        QuantityKind.Conductivity => Us ? "ft/d" : "m/d",
        QuantityKind.Transmissivity => Us ? "ft2/d" : "m2/d",
        QuantityKind.Rate => Us ? "gpm" : "m3/d",
        QuantityKind.Time => "d",
        QuantityKind.Area => Us ? "ft2" : "m2",
        _ => "",
    };

    /// <summary>A computed value without its unit, in the unit that <see cref="Unit"/> names.</summary>
    /// <param name="kind">What kind of quantity.</param>
    /// <param name="value">The value in metres and days; null: "none".</param>
    public string Number(QuantityKind kind, double? value) => value is not { } number
        ? None
        : kind is QuantityKind.Ratio or QuantityKind.Direction
            ? Trimmed(Figures(number, ComputedFigures + 1))
            : Figures(In(kind, number), ComputedFigures);

    /// <summary>A value that the user entered, with its unit; as many figures as a change of unit needs.</summary>
    /// <param name="kind">What kind of quantity.</param>
    /// <param name="value">The value in metres and days.</param>
    public string Entered(QuantityKind kind, double value) =>
        WithUnit(Trimmed(Figures(In(kind, value), EnteredFigures)), Unit(kind));

    /// <summary>A length or distance with its unit.</summary>
    /// <param name="metres">The length, m; null: "none".</param>
    public string Length(double? metres) => Plain(QuantityKind.Length, metres);

    /// <summary>An elevation with its unit, to 0.01 m or 0.1 ft.</summary>
    /// <param name="metres">The elevation, m; null: "none".</param>
    public string Elevation(double? metres) => metres is { } value
        ? double.IsFinite(value) ? WithUnit(ElevationNumber(value), Unit(QuantityKind.Length)) : NotANumber
        : None;

    /// <summary>An elevation without its unit, to 0.01 m or 0.1 ft.</summary>
    /// <param name="metres">The elevation, m.</param>
    public string ElevationNumber(double metres) => double.IsFinite(metres)
        ? Fixed(In(QuantityKind.Length, metres), Us ? 1 : 2)
        : NotANumber;

    /// <summary>A pumping rate with its unit: m3/d with L/s beside it, or gpm.</summary>
    /// <param name="cubicMetresPerDay">The rate, m3/d; null: "none".</param>
    public string Rate(double? cubicMetresPerDay) =>
        cubicMetresPerDay is { } rate && !Us && double.IsFinite(rate)
            ? $"{Plain(QuantityKind.Rate, rate)} ({Scaled(rate, "L/s")})"
            : Plain(QuantityKind.Rate, cubicMetresPerDay);

    /// <summary>A rate in the unit that people speak of, without a second unit: L/s or gpm; short, for labels.</summary>
    /// <param name="cubicMetresPerDay">The rate, m3/d; null: "none".</param>
    public string ShortRate(double? cubicMetresPerDay) =>
        cubicMetresPerDay is { } rate && !Us && double.IsFinite(rate)
            ? Scaled(rate, "L/s")
            : Plain(QuantityKind.Rate, cubicMetresPerDay);

    /// <summary>A hydraulic conductivity with its unit.</summary>
    /// <param name="metresPerDay">The conductivity, m/d; null: "none".</param>
    public string Conductivity(double? metresPerDay) => Plain(QuantityKind.Conductivity, metresPerDay);

    /// <summary>A transmissivity, or a discharge per unit width, with its unit.</summary>
    /// <param name="squareMetresPerDay">The transmissivity, m2/d; null: "none".</param>
    public string Transmissivity(double? squareMetresPerDay) => Plain(QuantityKind.Transmissivity, squareMetresPerDay);

    /// <summary>An area with its unit: m2 below 1 ha, then ha; ft2 below 1 acre, then acres.</summary>
    /// <param name="squareMetres">The area, m2; null: "none".</param>
    public string Area(double? squareMetres)
    {
        string large = Us ? "acre" : "ha";
        return squareMetres is { } area && double.IsFinite(area) && Math.Abs(area) >= Factor(large)
            ? Scaled(area, large) + (Us ? "s" : "")
            : Plain(QuantityKind.Area, squareMetres);
    }

    /// <summary>A time with its unit: days below 2 years of 365.25 d, else years.</summary>
    /// <param name="days">The time, d; null: "none".</param>
    public string Time(double? days) => days is { } time && double.IsFinite(time) && Math.Abs(time) >= LongTime
        ? Scaled(time, "yr")
        : Plain(QuantityKind.Time, days);

    /// <summary>A plain ratio.</summary>
    /// <param name="ratio">The ratio; null: "none".</param>
    public string Ratio(double? ratio) => Plain(QuantityKind.Ratio, ratio);

    /// <summary>A direction with its unit.</summary>
    /// <param name="degrees">Degrees clockwise from grid north; null: "none".</param>
    public string Direction(double? degrees) => Plain(QuantityKind.Direction, degrees);

    /// <summary>A share in per cent; one that is short of the whole never prints as the whole, nor a part as nothing.</summary>
    /// <param name="share">The share, 0 to 1; null: "none".</param>
    public string Percent(double? share)
    {
        const double Smallest = 0.001;
        return share switch
        {
            null => None,
            < 1 and > 1 - Smallest => "above 99.9 %",
            > 0 and < Smallest => "below 0.1 %",
            { } value when double.IsFinite(value) => Trimmed(Fixed(100 * value, PercentDecimals)) + " %",
            _ => NotANumber,
        };
    }

    private static double Factor(string unit) => UnitTable.Named(unit).Factor;

    private string Plain(QuantityKind kind, double? value) =>
        value is { } number && double.IsFinite(number) ? WithUnit(Number(kind, value), Unit(kind)) : Number(kind, value);

    private static string Scaled(double value, string unit) => WithUnit(Figures(value / Factor(unit), ComputedFigures), unit);

    private static string WithUnit(string number, string unit) => unit.Length == 0 ? number : $"{number} {unit}";

    /// <summary>A number to so many significant figures, without an exponent unless it is tiny.</summary>
    private static string Figures(double value, int figures)
    {
        const int SmallestExponent = -5;
        if (!double.IsFinite(value))
        {
            return NotANumber;
        }

        string scientific = value.ToString($"E{figures - 1}", CultureInfo.InvariantCulture);
        int mark = scientific.IndexOf('E', StringComparison.Ordinal);
        int exponent = int.Parse(scientific.AsSpan(mark + 1), CultureInfo.InvariantCulture);
        return value != 0 && exponent < SmallestExponent
            ? string.Create(CultureInfo.InvariantCulture, $"{scientific.AsSpan(0, mark)}e{exponent}")
            : Fixed(double.Parse(scientific, CultureInfo.InvariantCulture), Math.Max(figures - 1 - exponent, 0));
    }

    private static string Fixed(double value, int decimals)
    {
        string text = value.ToString($"F{decimals}", CultureInfo.InvariantCulture);
        bool isZero = text.AsSpan().IndexOfAnyInRange('1', '9') < 0;
        return isZero ? "0" : text;
    }

    /// <summary>A number without the zeros that end its decimals, before its exponent if it has one.</summary>
    private static string Trimmed(string number)
    {
        int exponent = number.IndexOf('e', StringComparison.Ordinal);
        string figures = exponent < 0 ? number : number[..exponent];
        return figures.Contains('.', StringComparison.Ordinal)
            ? figures.TrimEnd('0').TrimEnd('.') + number[figures.Length..]
            : number;
    }
}
