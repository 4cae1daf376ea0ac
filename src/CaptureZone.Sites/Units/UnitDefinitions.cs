using System.Collections.Immutable;

namespace CaptureZone.Sites.Units;

/// <summary>
/// Every unit with its derivation in exact numbers. The definitions are those of the SI and, for US customary units, of the
/// international yard and pound agreement of 1959 (from memory: NIST Special Publication 811, Appendix B).
/// </summary>
internal static class UnitDefinitions
{
    /// <summary>All units, by dimension, from small to large where that makes sense.</summary>
    public static ImmutableArray<Unit> All { get; } = Define();

    private static ImmutableArray<Unit> Define()
    {
        Measure m = Measure.Metre;
        Measure mm = "0.001" * m;
        Measure cm = "0.01" * m;
        Measure km = "1000" * m;
        Measure inch = "0.0254" * m;
        Measure ft = "12" * inch;
        Measure mi = "5280" * ft;
        Measure ftUS = "1200" * m / "3937";

        Measure d = Measure.Day;
        Measure h = d / "24";
        Measure min = h / "60";
        Measure s = min / "60";
        Measure yr = "365.25" * d;

        Measure m2 = m * m;
        Measure ft2 = ft * ft;
        Measure acre = "43560" * ft2;
        Measure m3 = m2 * m;
        Measure litre = "0.001" * m3;
        Measure ft3 = ft2 * ft;
        Measure gal = "231" * (inch * inch * inch);
        Measure acreFt = acre * ft;

        return
        [
            Define("mm", mm, "0.001 m"),
            Define("cm", cm, "0.01 m"),
            Define("m", m, "the SI's base unit"),
            Define("km", km, "1000 m"),
            Define("in", inch, "0.0254 m (international inch)"),
            Define("ft", ft, "12 in = 0.3048 m (international foot)"),
            Define("yd", "3" * ft, "3 ft"),
            Define("mi", mi, "5280 ft (international mile)"),
            Define("ftUS", ftUS, "1200/3937 m (US survey foot)", "ft US", "US ft", "US survey ft", "survey ft"),

            Define("m2", m2, "m x m"),
            Define("ha", "10000" * m2, "10 000 m2"),
            Define("km2", km * km, "km x km"),
            Define("ft2", ft2, "ft x ft", "sq ft"),
            Define("acre", acre, "43 560 ft2 (of the international foot)"),
            Define("mi2", mi * mi, "mi x mi", "sq mi"),

            Define("s", s, "d / 86 400"),
            Define("min", min, "60 s"),
            Define("h", h, "60 min"),
            Define("d", d, "24 h"),
            Define("yr", yr, "365.25 d (Julian year)"),

            Define("m/s", m / s, "m / s"),
            Define("cm/s", cm / s, "cm / s"),
            Define("mm/s", mm / s, "mm / s"),
            Define("um/s", "0.000001" * m / s, "0.000 001 m / s (micrometre a second)"),
            Define("m/h", m / h, "m / h"),
            Define("cm/h", cm / h, "cm / h"),
            Define("mm/h", mm / h, "mm / h"),
            Define("m/d", m / d, "m / d"),
            Define("cm/d", cm / d, "cm / d"),
            Define("mm/d", mm / d, "mm / d"),
            Define("m/yr", m / yr, "m / yr"),
            Define("cm/yr", cm / yr, "cm / yr"),
            Define("mm/yr", mm / yr, "mm / yr"),
            Define("ft/s", ft / s, "ft / s"),
            Define("ft/min", ft / min, "ft / min"),
            Define("ft/h", ft / h, "ft / h"),
            Define("ft/d", ft / d, "ft / d"),
            Define("ft/yr", ft / yr, "ft / yr"),
            Define("in/h", inch / h, "in / h"),
            Define("in/d", inch / d, "in / d"),
            Define("in/yr", inch / yr, "in / yr"),
            Define("gpd/ft2", gal / d / ft2, "231 in3 / d / ft2 (US gallons)", "gal/d/ft2"),

            Define("m2/s", m2 / s, "m2 / s"),
            Define("m2/min", m2 / min, "m2 / min"),
            Define("m2/h", m2 / h, "m2 / h"),
            Define("m2/d", m2 / d, "m2 / d", "m3/d/m"),
            Define("m2/yr", m2 / yr, "m2 / yr"),
            Define("cm2/s", cm * cm / s, "cm2 / s"),
            Define("ft2/s", ft2 / s, "ft2 / s"),
            Define("ft2/min", ft2 / min, "ft2 / min"),
            Define("ft2/d", ft2 / d, "ft2 / d", "ft3/d/ft"),
            Define("gpd/ft", gal / d / ft, "231 in3 / d / ft (US gallons)", "gal/d/ft"),

            Define("L/s", litre / s, "0.001 m3 / s", "lps"),
            Define("L/min", litre / min, "0.001 m3 / min", "lpm"),
            Define("L/h", litre / h, "0.001 m3 / h"),
            Define("L/d", litre / d, "0.001 m3 / d"),
            Define("ML/d", "1000" * m3 / d, "1000 m3 / d (megalitre a day)"),
            Define("m3/s", m3 / s, "m3 / s"),
            Define("m3/min", m3 / min, "m3 / min"),
            Define("m3/h", m3 / h, "m3 / h"),
            Define("m3/d", m3 / d, "m3 / d"),
            Define("m3/yr", m3 / yr, "m3 / yr"),
            Define("gpm", gal / min, "231 in3 / min (US gallons)", "gal/min", "GPM"),
            Define("gph", gal / h, "231 in3 / h (US gallons)", "gal/h", "GPH"),
            Define("gpd", gal / d, "231 in3 / d (US gallons)", "gal/d", "GPD"),
            Define("MGD", "1000000" * gal / d, "1 000 000 x 231 in3 / d (US gallons)", "mgd", "Mgd", "Mgal/d"),
            Define("cfs", ft3 / s, "ft3 / s", "ft3/s", "CFS"),
            Define("cfm", ft3 / min, "ft3 / min", "ft3/min", "CFM"),
            Define("ft3/d", ft3 / d, "ft3 / d"),
            Define("acre-ft/d", acreFt / d, "43 560 ft3 / d", "acre ft/d"),
            Define("acre-ft/yr", acreFt / yr, "43 560 ft3 / yr", "acre ft/yr", "afy", "AFY"),
        ];
    }

    private static Unit Define(string symbol, Measure measure, string definition, params string[] alsoWritten) =>
        new(symbol, measure, definition, [.. alsoWritten]);
}
