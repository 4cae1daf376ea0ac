using System.Text;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class LayerTests
{
    private static readonly Report Sample = SampleReport.Create();

    public static TheoryData<string> Names => [.. SiteLayers.All(Sample).Select(layer => layer.Name)];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_layer_has_names_that_every_format_takes(string name)
    {
        Layer layer = Find(name);
        Assert.All(layer.Columns, column => Assert.Matches("^[a-z][a-z0-9_]*$", column.Name));
        Assert.All(layer.Columns, column => Assert.InRange(Encoding.UTF8.GetByteCount(column.Short), 1, 10));
        Assert.Equal(layer.Columns.Length, layer.Columns.Select(column => column.Name).Distinct().Count());
        Assert.Equal(layer.Columns.Length, layer.Columns.Select(column => column.Short).Distinct().Count());
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_feature_has_one_cell_of_the_right_kind_per_column(string name)
    {
        Layer layer = Find(name);
        Assert.NotEmpty(layer.Features);
        foreach (Feature feature in layer.Features)
        {
            Assert.Equal(layer.Columns.Length, feature.Cells.Length);
            Assert.All(layer.Columns.Zip(feature.Cells), pair => Assert.True(Fits(pair.First.Kind, pair.Second)));
        }
    }

    [Fact]
    public void The_layers_are_named_as_the_files() => Assert.Equal(
        ["capture_zones", "travel_time_zones", "paths", "stagnation_points", "head_contours"],
        SiteLayers.Computed(Sample).Select(layer => layer.Name));

    [Fact]
    public void A_path_that_leaves_the_frame_is_clipped_and_says_so()
    {
        Layer paths = Find("paths");
        int clipped = paths.Columns.Select(column => column.Name).ToList().IndexOf("clipped");
        int length = paths.Columns.Select(column => column.Name).ToList().IndexOf("length_m");
        Feature far = Assert.Single(paths.Features, feature => feature.Cells[clipped].Flag == true);
        Assert.True(far.Shape.Length < far.Cells[length].Number - 100);
        Assert.All(
            paths.Features.Where(feature => feature.Cells[clipped].Flag == false),
            feature => Assert.Equal(feature.Cells[length].Number!.Value, feature.Shape.Length, 1e-5));
    }

    [Fact]
    public void Every_column_is_explained_in_the_reference()
    {
        string reference = RepositoryFiles.Read("docs/results.md");
        foreach (Layer layer in SiteLayers.All(Sample))
        {
            Assert.Contains($"`{layer.Name}`", reference, StringComparison.Ordinal);
            Assert.All(layer.Columns, column => Assert.Contains($"`{column.Name}`", reference, StringComparison.Ordinal));
            Assert.All(layer.Columns, column => Assert.Contains($"`{column.Short}`", reference, StringComparison.Ordinal));
        }
    }

    private static Layer Find(string name) => SiteLayers.All(Sample).Single(layer => layer.Name == name);

    private static bool Fits(ColumnKind kind, Cell cell) => kind switch
    {
        ColumnKind.Text => cell.Number is null && cell.Flag is null,
        ColumnKind.Flag => cell.Flag is not null,
        ColumnKind.Whole => cell.Number is { } number && double.IsInteger(number),
        _ => cell.Text is null && cell.Flag is null,
    };
}
