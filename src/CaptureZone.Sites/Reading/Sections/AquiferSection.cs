using CaptureZone.Aquifers;
using CaptureZone.Sites.Units;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>Reads [aquifer].</summary>
internal static class AquiferSection
{
    private static readonly Field Conductivity =
        new("conductivity", "Hydraulic conductivity", "18 m/d") { Limit = Limit.Positive, Usual = UsualRange.Conductivity };

    private static readonly Field Transmissivity = new("transmissivity", "Transmissivity", "216 m2/d") { Limit = Limit.Positive };
    private static readonly Field Base = new("base", "Base of the aquifer", "212 m") { Required = true };
    private static readonly Field Thick = new("thickness", "", "12 m") { Usual = UsualRange.Thickness };
    private static readonly Field Top = new("top", "Top of the aquifer", "224 m");

    private static readonly Field Porosity =
        new("porosity", "Effective porosity", "0.25") { Required = true, Limit = Limit.Share, Usual = UsualRange.Porosity };

    /// <summary>The aquifer; null when it cannot be told.</summary>
    /// <param name="table">The table.</param>
    public static Aquifer? Read(TableReader table)
    {
        double? conductivity = table.Quantity(Conductivity, Dimension.Conductivity);
        double? transmissivity = table.Quantity(Transmissivity, Dimension.Transmissivity);
        double? lower = table.Quantity(Base, Dimension.Length);
        double? upper = table.Quantity(Top, Dimension.Length);
        double? porosity = table.Number(Porosity, QuantityKind.Ratio);
        double? thickness = Thickness(table, lower, upper);
        CheckOneOfTwo(table);
        conductivity ??= OfTransmissivity(table, transmissivity, thickness);
        table.Finish();
        return conductivity is { } k && lower is { } b && porosity is { } n ? new Aquifer(k, b, upper, n) : null;
    }

    private static double? Thickness(TableReader table, double? lower, double? upper)
    {
        if (lower is not { } b || upper is not { } t)
        {
            return null;
        }

        if (t <= b)
        {
            table.Error("top", "top lies at or below base; both are elevations, and top is the higher one");
            return null;
        }

        table.WarnIfUnusual(Thick, table.PlaceOf("top"), t - b, $"top - base = {Words.Number(t - b)} m");
        return t - b;
    }

    private static void CheckOneOfTwo(TableReader table)
    {
        if (table.Has("conductivity") && table.Has("transmissivity"))
        {
            table.Error("transmissivity", "both conductivity and transmissivity are given; leave one of the two out");
        }
        else if (!table.Has("conductivity") && !table.Has("transmissivity"))
        {
            table.Missing("conductivity", "[aquifer] lacks conductivity; add a line such as conductivity = \"18 m/d\"");
        }
        else if (table.Has("transmissivity") && !table.Has("top"))
        {
            table.Error(
                "transmissivity",
                "transmissivity needs a top, since conductivity = transmissivity / (top - base); "
                + "add top, or give conductivity");
        }
    }

    private static double? OfTransmissivity(TableReader table, double? transmissivity, double? thickness)
    {
        double? conductivity = transmissivity / thickness;
        if (conductivity is { } k)
        {
            table.WarnIfUnusual(Conductivity, table.PlaceOf("transmissivity"), k, $"transmissivity / (top - base) = {Words.Number(k)} m/d");
        }

        return conductivity;
    }
}
