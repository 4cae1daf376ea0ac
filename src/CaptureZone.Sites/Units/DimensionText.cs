namespace CaptureZone.Sites.Units;

/// <summary>Dimensions in words, and which units fit them.</summary>
internal static class DimensionText
{
    /// <summary>Whether a unit measures a dimension: times measure resistances, lengths per time both conductivity and recharge.</summary>
    /// <param name="unit">The unit.</param>
    /// <param name="dimension">The dimension.</param>
    public static bool Fits(Unit unit, Dimension dimension) => unit.Dimension == Measured(dimension);

    /// <summary>What is expected: "a pumping rate".</summary>
    /// <param name="dimension">The dimension.</param>
    public static string Expected(Dimension dimension) => dimension switch
    {
        Dimension.Length => "a length",
        Dimension.Area => "an area",
        Dimension.Time => "a time",
        Dimension.Resistance => "a resistance (a time)",
        Dimension.Conductivity => "a hydraulic conductivity",
        Dimension.Recharge => "a rate of recharge",
        Dimension.Transmissivity => "a transmissivity",
        Dimension.Rate => "a pumping rate",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };

    /// <summary>What a unit was found to measure: "a conductivity or a rate of recharge".</summary>
    /// <param name="unit">The unit.</param>
    public static string Found(Unit unit) =>
        unit.Dimension == Dimension.Conductivity ? "a conductivity or a rate of recharge" : Expected(unit.Dimension);

    /// <summary>The unit to show in an example.</summary>
    /// <param name="dimension">The dimension.</param>
    public static string ExampleUnit(Dimension dimension) => dimension switch
    {
        Dimension.Length => "m",
        Dimension.Area => "m2",
        Dimension.Time => "yr",
        Dimension.Resistance => "d",
        Dimension.Conductivity => "m/d",
        Dimension.Recharge => "mm/yr",
        Dimension.Transmissivity => "m2/d",
        Dimension.Rate => "L/s",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };

    /// <summary>The dimension under which the table lists the units that fit.</summary>
    private static Dimension Measured(Dimension dimension) => dimension switch
    {
        Dimension.Resistance => Dimension.Time,
        Dimension.Recharge => Dimension.Conductivity,
        _ => dimension,
    };
}
