using CaptureZone.Jobs;
using CaptureZone.Jobs.Files;

namespace CaptureZone.Tests.Jobs.Files;

public sealed class ResultFolderTests : IDisposable
{
    private readonly TempFolder _temp = new();

    private string Out => _temp["demo-results"];

    public void Dispose() => _temp.Dispose();

    [Fact]
    public void A_complete_folder_holds_what_was_written_and_its_record_and_nothing_lies_beside_it()
    {
        Make("one");
        Assert.Equal(["demo-results", "demo-results/.capturezone-folder.json", "demo-results/memo.md"], _temp.Entries);
        Assert.Equal("one", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void A_folder_that_is_not_completed_leaves_nothing()
    {
        using (ResultFolder folder = ResultFolder.Begin(Out, replace: false))
        {
            File.WriteAllText(Path.Combine(folder.WorkPath, "memo.md"), "half");
            Assert.False(Directory.Exists(Out));
        }

        Assert.Empty(_temp.Entries);
    }

    [Fact]
    public void A_folder_that_nobody_touched_is_replaced_whole()
    {
        using (ResultFolder folder = ResultFolder.Begin(Out, replace: false))
        {
            File.WriteAllText(Path.Combine(folder.WorkPath, "old.txt"), "old");
            folder.Complete();
        }

        Make("two");
        Assert.Equal(["demo-results", "demo-results/.capturezone-folder.json", "demo-results/memo.md"], _temp.Entries);
    }

    [Fact]
    public void The_old_folder_stands_until_the_new_one_is_complete()
    {
        Make("one");
        using (ResultFolder folder = ResultFolder.Begin(Out, replace: false))
        {
            File.WriteAllText(Path.Combine(folder.WorkPath, "memo.md"), "two");
            Assert.Equal("one", _temp.Read("demo-results/memo.md"));
        }

        Assert.Equal("one", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void A_folder_with_a_changed_file_is_kept_and_the_file_is_named()
    {
        Make("one");
        _temp.Write("demo-results/memo.md", "signed");
        AccessException refusal = Assert.Throws<AccessException>(() => Make("two"));
        Assert.Equal(
            $"{Out}: kept, since someone worked in it (memo.md was changed); give another --out, or --replace to lose these changes",
            refusal.Message);
        Assert.Equal("signed", _temp.Read("demo-results/memo.md"));
        Assert.DoesNotContain(_temp.Entries, entry => entry.Contains(".new-", StringComparison.Ordinal));
    }

    [Fact]
    public void A_folder_with_an_added_file_is_kept_and_the_file_is_named()
    {
        Make("one");
        Directory.CreateDirectory(_temp["demo-results/notes"]);
        _temp.Write("demo-results/notes/call.txt", "mine");
        AccessException refusal = Assert.Throws<AccessException>(() => Make("two"));
        Assert.Contains("notes/call.txt was added", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_folder_from_which_a_file_was_deleted_is_replaced()
    {
        Make("one");
        File.Delete(_temp["demo-results/memo.md"]);
        Make("two");
        Assert.Equal("two", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void A_changed_folder_is_replaced_when_that_is_asked_for()
    {
        Make("one");
        _temp.Write("demo-results/memo.md", "signed");
        Make("two", replace: true);
        Assert.Equal("two", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void A_file_changed_while_the_new_folder_was_written_is_kept()
    {
        Make("one");
        using (ResultFolder folder = ResultFolder.Begin(Out, replace: false))
        {
            _temp.Write("demo-results/memo.md", "signed meanwhile");
            Assert.Throws<AccessException>(folder.Complete);
        }

        Assert.Equal("signed meanwhile", _temp.Read("demo-results/memo.md"));
        Assert.Equal(3, _temp.Entries.Length);
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void A_folder_of_someone_else_is_never_replaced(bool replace)
    {
        Directory.CreateDirectory(Out);
        _temp.Write("demo-results/thesis.txt", "years of work");
        AccessException refusal = Assert.Throws<AccessException>(() => Make("one", replace));
        Assert.Contains("not this program's results", refusal.Message, StringComparison.Ordinal);
        Assert.Equal("years of work", _temp.Read("demo-results/thesis.txt"));
    }

    [Theory]
    [InlineData("not json")]
    [InlineData("{\"files\": 3}")]
    [InlineData("[]")]
    public void A_folder_with_a_broken_record_counts_as_someone_elses(string record)
    {
        Make("one");
        _temp.Write("demo-results/.capturezone-folder.json", record);
        Assert.Throws<AccessException>(() => Make("two", replace: true));
        Assert.Equal("one", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void An_empty_folder_is_taken()
    {
        Directory.CreateDirectory(Out);
        Make("one");
        Assert.Equal("one", _temp.Read("demo-results/memo.md"));
    }

    [Fact]
    public void A_file_in_the_place_is_refused()
    {
        _temp.Write("demo-results", "a file");
        AccessException refusal = Assert.Throws<AccessException>(() => Make("one", replace: true));
        Assert.Equal($"{Out}: this is a file; give a folder as --out", refusal.Message);
        Assert.Equal(["demo-results"], _temp.Entries);
    }

    [Fact]
    public void A_link_in_the_place_is_refused_and_what_it_points_at_stays()
    {
        Directory.CreateDirectory(_temp["elsewhere"]);
        Directory.CreateSymbolicLink(Out, _temp["elsewhere"]);
        AccessException refusal = Assert.Throws<AccessException>(() => Make("one", replace: true));
        Assert.Contains("this is a link", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_link_inside_a_result_folder_counts_as_added_and_is_not_followed()
    {
        Make("one");
        Directory.CreateDirectory(_temp["elsewhere"]);
        _temp.Write("elsewhere/data.txt", "data");
        Directory.CreateSymbolicLink(_temp["demo-results/link"], _temp["elsewhere"]);
        AccessException refusal = Assert.Throws<AccessException>(() => Make("two"));
        Assert.Contains("(link was added)", refusal.Message, StringComparison.Ordinal);
        Make("two", replace: true);
        Assert.Equal("data", _temp.Read("elsewhere/data.txt"));
    }

    [Fact]
    public void A_folder_in_which_a_named_file_lies_is_refused_even_to_replace()
    {
        Make("one");
        string site = _temp.Write("demo-results/demo.toml", "site");
        AccessException refusal = Assert.Throws<AccessException>(() => ResultFolder.Begin(Out, replace: true, site));
        Assert.Contains("lies in this folder and would be lost", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_missing_parent_folder_is_named()
    {
        AccessException refusal = Assert.Throws<AccessException>(() => ResultFolder.Begin(_temp["no/such/results"], replace: false));
        Assert.Contains($"there is no folder {_temp["no/such"]}", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_another_program_holds_open_is_told_as_such()
    {
        Make("one");
        using FileStream held = new(_temp["demo-results/memo.md"], FileMode.Open, FileAccess.ReadWrite, FileShare.None);
        AccessException refusal = Assert.Throws<AccessException>(() => Make("two"));
        Assert.Contains("in use by another program", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void What_a_killed_run_left_is_cleaned_by_the_next()
    {
        Directory.CreateDirectory(_temp["demo-results.new-0a1b2c3d"]);
        _temp.Write("demo-results.new-0a1b2c3d/.capturezone-writing", "");
        _temp.Write("demo-results.new-0a1b2c3d/map.png", "half");
        Make("one");
        Assert.Equal(["demo-results", "demo-results/.capturezone-folder.json", "demo-results/memo.md"], _temp.Entries);
    }

    [Fact]
    public void What_another_run_is_writing_is_left_alone()
    {
        using ResultFolder first = ResultFolder.Begin(Out, replace: false);
        Make("second");
        Assert.True(Directory.Exists(first.WorkPath));
        first.Complete();
        Assert.Equal(["demo-results", "demo-results/.capturezone-folder.json"], _temp.Entries);
    }

    [Fact]
    public void A_sibling_of_another_shape_is_left_alone()
    {
        Directory.CreateDirectory(_temp["demo-results.new-ideas"]);
        Make("one");
        Assert.Contains("demo-results.new-ideas", _temp.Entries);
    }

    [Fact]
    public void An_old_folder_that_a_killed_run_had_moved_aside_comes_back()
    {
        Make("one");
        Directory.Move(Out, _temp["demo-results.old-0a1b2c3d"]);
        ResultFolder.Begin(Out, replace: false).Dispose();
        Assert.Equal("one", _temp.Read("demo-results/memo.md"));
        Assert.Equal(3, _temp.Entries.Length);
    }

    [Fact]
    public void An_old_folder_that_a_killed_run_had_not_yet_deleted_is_deleted()
    {
        Make("one");
        Directory.Move(Out, _temp["demo-results.old-0a1b2c3d"]);
        Directory.CreateDirectory(Out);
        Make("two");
        Assert.Equal("two", _temp.Read("demo-results/memo.md"));
        Assert.Equal(3, _temp.Entries.Length);
    }

    private void Make(string content, bool replace = false)
    {
        using ResultFolder folder = ResultFolder.Begin(Out, replace);
        File.WriteAllText(Path.Combine(folder.WorkPath, "memo.md"), content);
        folder.Complete();
    }
}
