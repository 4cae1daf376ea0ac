using CaptureZone.Outputs.Text;
using CaptureZone.Sites;

namespace CaptureZone.Tests.Outputs.Text;

public sealed class PrinterTests
{
    private static readonly Printer Metric = new(ReportUnits.Metric);
    private static readonly Printer Us = new(ReportUnits.Us);

    [Fact]
    public void A_rate_prints_in_cubic_metres_a_day_and_litres_a_second_or_in_gallons_a_minute()
    {
        Assert.Equal("562 m3/d (6.50 L/s)", Metric.Rate(561.6));
        Assert.Equal("6.50 L/s", Metric.ShortRate(561.6));

        // 1 gpm = 231 in3 / min = 5.450992969728 m3/d, from the exact inch.
        Assert.Equal("100 gpm", Us.Rate(545.0992969728));
    }

    [Theory]
    [InlineData(9_999, "10000 m2", "2.47 acres")]
    [InlineData(10_000, "1.00 ha", "2.47 acres")]
    [InlineData(1_234_500, "123 ha", "305 acres")]
    [InlineData(100, "100 m2", "1080 ft2")]
    public void An_area_prints_in_hectares_or_acres_when_it_is_large(double area, string metric, string us)
    {
        Assert.Equal(metric, Metric.Area(area));
        Assert.Equal(us, Us.Area(area));
    }

    [Theory]
    [InlineData(365.25, "365 d")]
    [InlineData(730.49, "730 d")]
    [InlineData(730.5, "2.00 yr")]
    [InlineData(3652.5, "10.0 yr")]
    public void A_time_prints_in_days_below_two_years(double days, string text) => Assert.Equal(text, Metric.Time(days));

    [Theory]
    [InlineData(QuantityKind.Length, 0.3048, "1.00", "ft")]
    [InlineData(QuantityKind.Conductivity, 18, "59.1", "ft/d")]
    [InlineData(QuantityKind.Transmissivity, 216, "2330", "ft2/d")]
    [InlineData(QuantityKind.Ratio, 0.0031, "0.0031", "")]
    [InlineData(QuantityKind.Direction, 112, "112", "degrees")]
    public void Us_units_are_feet_and_gallons(QuantityKind kind, double value, string number, string unit)
    {
        Assert.Equal(number, Us.Number(kind, value));
        Assert.Equal(unit, Us.Unit(kind));
    }

    [Theory]
    [InlineData(0.0, "0 m")]
    [InlineData(-41.74, "-41.7 m")]
    [InlineData(9.996, "10.0 m")]
    [InlineData(12345.6, "12300 m")]
    [InlineData(1.5e-7, "1.50e-7 m")]
    [InlineData(double.NaN, "-")]
    [InlineData(double.PositiveInfinity, "-")]
    [InlineData(null, "none")]
    public void A_length_prints_with_three_figures(double? value, string text) => Assert.Equal(text, Metric.Length(value));

    [Fact]
    public void A_negative_zero_prints_without_its_sign() => Assert.Equal("0 m", Metric.Length(double.NegativeZero));

    [Theory]
    [InlineData(231.604, "231.60 m", "759.9 ft")]
    [InlineData(null, "none", "none")]
    [InlineData(double.NaN, "-", "-")]
    public void An_elevation_keeps_its_decimals(double? value, string metric, string us)
    {
        Assert.Equal(metric, Metric.Elevation(value));
        Assert.Equal(us, Us.Elevation(value));
    }

    [Fact]
    public void An_entered_value_prints_as_it_was_written()
    {
        Assert.Equal("231.6 m", Metric.Entered(QuantityKind.Length, 231.6));
        Assert.Equal("759.84 ft", Us.Entered(QuantityKind.Length, 231.6));
        Assert.Equal("0.24", Us.Entered(QuantityKind.Ratio, 0.24));
        Assert.Equal("60 ft/d", Us.Entered(QuantityKind.Conductivity, 60 * 0.3048));
    }

    [Theory]
    [InlineData(1.0, "100 %")]
    [InlineData(0.99999, "above 99.9 %")]
    [InlineData(0.884, "88.4 %")]
    [InlineData(1e-6, "below 0.1 %")]
    [InlineData(0.0, "0 %")]
    [InlineData(null, "none")]
    public void A_share_never_rounds_to_the_whole_or_to_nothing(double? share, string text) =>
        Assert.Equal(text, Metric.Percent(share));
}
