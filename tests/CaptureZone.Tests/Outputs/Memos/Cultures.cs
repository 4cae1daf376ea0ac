using System.Globalization;

namespace CaptureZone.Tests.Outputs.Memos;

/// <summary>
/// Runs under a culture whose numbers and dates are written otherwise; they are set by hand, so that they differ also on a machine without
/// culture data.
/// </summary>
internal static class Cultures
{
    /// <summary>What the work gives under a culture with comma decimals.</summary>
    public static T Under<T>(string name, Func<T> work)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo culture = Find(name);
        culture.NumberFormat.NumberDecimalSeparator = ",";
        culture.NumberFormat.NumberGroupSeparator = ".";
        culture.NumberFormat.NegativeSign = "\u2212";
        culture.DateTimeFormat.ShortDatePattern = "dd.MM.yyyy";
        CultureInfo.CurrentCulture = culture;
        try
        {
            return work();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static CultureInfo Find(string name)
    {
        try
        {
            return (CultureInfo)CultureInfo.GetCultureInfo(name).Clone();
        }
        catch (CultureNotFoundException)
        {
            return (CultureInfo)CultureInfo.InvariantCulture.Clone();
        }
    }
}
