namespace CaptureZone.Sites.Reading;

/// <summary>
/// What values a quantity usually has at sites like these, and who says so. A value outside is legal and gives a warning;
/// a range is never a default.
/// </summary>
/// <param name="Low">Least usual value, in metres and days.</param>
/// <param name="High">Largest usual value, in metres and days.</param>
/// <param name="Words">The range in words with its source.</param>
internal sealed record UsualRange(double Low, double High, string Words)
{
    /// <summary>Silty sand 1e-7 m/s to clean sand 1e-2 m/s.</summary>
    public static readonly UsualRange Conductivity = new(
        1e-7 * 86400, 1e-2 * 86400, "0.00864 to 864 m/d (silty to clean sand; Freeze & Cherry 1979, Table 2.2, from memory)");

    /// <summary>Sandstone of the volumetric method to the upper end of sand.</summary>
    public static readonly UsualRange Porosity = new(
        0.06, 0.5, "0.06 (sandstone; 35 Ill. Adm. Code 671, Appendix A) to 0.5 (sand; Freeze & Cherry 1979, Table 2.4, from memory)");

    /// <summary>Regional gradients; 0 stands for none and is asked for on purpose.</summary>
    public static readonly UsualRange Gradient = new(1e-4, 0.05, "0.0001 to 0.05 (common practice, no source)");

    /// <summary>Thickness of an aquifer that two dimensions describe.</summary>
    public static readonly UsualRange Thickness = new(0.5, 300, "0.5 to 300 m (common practice, no source)");

    /// <summary>Radius of a screen's bore.</summary>
    public static readonly UsualRange Radius = new(0.02, 1, "0.02 to 1 m (common practice, no source)");

    /// <summary>Rate of one well; 0 stands for an idle well.</summary>
    public static readonly UsualRange Rate = new(0.1, 20_000, "0.1 to 20000 m3/d (common practice, no source)");

    /// <summary>Retardation of what still moves with the water.</summary>
    public static readonly UsualRange Retardation = new(1, 100, "1 to 100 (common practice, no source)");

    /// <summary>Travel times over which a steady picture is believed.</summary>
    public static readonly UsualRange TravelTime = new(1, 100 * 365.25, "1 d to 100 yr (common practice, no source)");

    /// <summary>Whether a value is usual.</summary>
    /// <param name="value">The value, in metres and days.</param>
    public bool Holds(double value) => value == 0 || (value >= Low && value <= High);
}
