using System.Text;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Points;

namespace CaptureZone.Tests.Jobs.Points;

public sealed class PointTableTests
{
    [Theory]
    [InlineData("name,x,y\nMW-1,562310.5,4641240\n")]
    [InlineData("name,x,y\r\nMW-1,562310.5,4641240")]
    [InlineData("\uFEFFname,x,y\nMW-1,562310.5,4641240\n")]
    [InlineData("\nY, X, Name, depth\n4641240, 562310.5, MW-1, 3\n\n,,,\n")]
    [InlineData("\"name\",\"x\",\"y\"\n\"MW-1\",\"562310.5\",\"4.64124e6\"\n")]
    public void A_table_is_read_in_any_usual_form(string text) =>
        Assert.Equal([new NamedPoint("MW-1", 562310.5, 4641240)], Read(text));

    [Fact]
    public void A_quoted_name_may_hold_commas_quotes_and_line_ends() =>
        Assert.Equal(
            [new NamedPoint("well \"A\", old\nshaft", 1, 2), new NamedPoint("B", 3, 4)],
            Read("name,x,y\n\"well \"\"A\"\", old\nshaft\",1,2\nB,3,4\n"));

    [Theory]
    [InlineData("", "p.csv:1:1: error: the table is empty; expected a line \"name,x,y\" and one line for each point")]
    [InlineData("name,x,y\n", "p.csv:1:1: error: the table has a heading but no point below it")]
    [InlineData("A,1,2\n", "p.csv:1:1: error: the first line is \"A,1,2\"; expected the columns name,x,y")]
    [InlineData("name;x;y\nA;1;2\n", "p.csv:1:1: error: the columns are separated by semicolons; expected commas between them and points in numbers")]
    [InlineData("name,x,y\nA,1,2\nB,3\n", "p.csv:3:1: error: this line has 2 fields, the heading 3; a number takes a point, a name with a comma quotes")]
    [InlineData("name,x,y\nA,1,5,2,5\n", "p.csv:2:1: error: this line has 5 fields, the heading 3; a number takes a point, a name with a comma quotes")]
    [InlineData("name,x,y\nA, 12e,2\n", "p.csv:2:4: error: x is \"12e\"; expected a number such as 562310.5, in the site's coordinates")]
    [InlineData("name,x,y\nA,\"1,5\",2\n", "p.csv:2:3: error: x is \"1,5\"; expected a number such as 562310.5, in the site's coordinates")]
    [InlineData("name,x,y\nA,1,NaN\n", "p.csv:2:5: error: y is \"NaN\"; expected a number such as 562310.5, in the site's coordinates")]
    [InlineData("name,x,y\nA,1,1e400\n", "p.csv:2:5: error: y is \"1e400\"; expected a number such as 562310.5, in the site's coordinates")]
    [InlineData("name,x,y\n,1,2\n", "p.csv:2:1: error: this point has no name")]
    public void A_mistake_is_told_with_its_place(string text, string complaint) => Assert.Equal([complaint], Complaints(text));

    [Fact]
    public void Every_mistake_is_told_at_once() =>
        Assert.Equal(
            ["p.csv:2:3", "p.csv:2:5", "p.csv:5:1"],
            Complaints("name,x,y\nA,a,b\nB,1,2\n\nC\n").Select(text => text[..text.IndexOf(": error", StringComparison.Ordinal)]));

    [Fact]
    public void A_line_that_is_not_UTF_8_is_named()
    {
        byte[] bytes = [.. "name,x,y\nA,1,2\nB"u8, 0xFC, .. ",3,4\n"u8];
        InputRefusedException refusal = Assert.Throws<InputRefusedException>(() => PointTable.Read("p.csv", bytes));
        Assert.Equal(3, refusal.Complaints.Single().Line);
    }

    private static NamedPoint[] Read(string text) => [.. PointTable.Read("p.csv", Encoding.UTF8.GetBytes(text))];

    private static string[] Complaints(string text) =>
        [.. Assert.Throws<InputRefusedException>(() => Read(text)).Complaints.Select(complaint => complaint.ToString())];
}
