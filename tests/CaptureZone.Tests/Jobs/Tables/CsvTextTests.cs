using CaptureZone.Jobs.Tables;

namespace CaptureZone.Tests.Jobs.Tables;

public sealed class CsvTextTests
{
    [Theory]
    [InlineData(4641240.123456, "4641240.123")]
    [InlineData(0.1 + 0.2, "0.3")]
    [InlineData(-0.0, "0")]
    [InlineData(1e-7, "1E-07")]
    [InlineData(double.NaN, "")]
    [InlineData(double.PositiveInfinity, "")]
    public void A_figure_has_ten_significant_digits_and_what_is_no_number_is_empty(double value, string text) =>
        Assert.Equal(text, CsvText.Figure(value));

    [Theory]
    [InlineData("RW-1", "RW-1")]
    [InlineData("well, old", "\"well, old\"")]
    [InlineData("the \"big\" one", "\"the \"\"big\"\" one\"")]
    [InlineData(" blank", "\" blank\"")]
    [InlineData("two\nlines", "\"two\nlines\"")]
    public void A_name_is_quoted_where_it_must_be(string name, string text)
    {
        StringWriter to = new();
        CsvText.WriteLine(to, name, "2");
        Assert.Equal(text + ",2\n", to.ToString());
    }
}
