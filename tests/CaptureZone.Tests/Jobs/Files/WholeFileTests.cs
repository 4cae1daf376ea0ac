using System.Text;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Files;

namespace CaptureZone.Tests.Jobs.Files;

public sealed class WholeFileTests : IDisposable
{
    private readonly TempFolder _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public void A_file_appears_whole()
    {
        WholeFile.Write(_temp["a.csv"], replace: false, stream => stream.Write("text"u8));
        Assert.Equal(["a.csv"], _temp.Entries);
        Assert.Equal("text", _temp.Read("a.csv"));
    }

    [Fact]
    public void A_writer_that_fails_leaves_nothing()
    {
        Assert.Throws<InvalidOperationException>(() => WholeFile.Write(_temp["a.csv"], replace: false, stream =>
        {
            stream.Write(Encoding.UTF8.GetBytes("half"));
            throw new InvalidOperationException();
        }));
        Assert.Empty(_temp.Entries);
    }

    [Fact]
    public void An_existing_file_is_overwritten_only_when_that_is_asked_for()
    {
        _temp.Write("a.csv", "old");
        Assert.Throws<AccessException>(() => WholeFile.Write(_temp["a.csv"], replace: false, stream => stream.Write("new"u8)));
        Assert.Equal("old", _temp.Read("a.csv"));
        WholeFile.Write(_temp["a.csv"], replace: true, stream => stream.Write("new"u8));
        Assert.Equal("new", _temp.Read("a.csv"));
    }

    [Fact]
    public void A_folder_in_the_place_is_refused() =>
        Assert.Throws<AccessException>(() => WholeFile.Write(_temp.FullPath, replace: true, _ => { }));

    [Fact]
    public void A_missing_folder_is_named()
    {
        AccessException refusal = Assert.Throws<AccessException>(() => WholeFile.Write(_temp["no/a.csv"], replace: false, _ => { }));
        Assert.Contains($"there is no folder {_temp["no"]}", refusal.Message, StringComparison.Ordinal);
    }
}
