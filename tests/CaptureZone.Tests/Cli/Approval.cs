using System.Runtime.CompilerServices;

namespace CaptureZone.Tests.Cli;

/// <summary>Compares with a text that was read and approved by a person; a text that is new or differs is written beside it.</summary>
public static class Approval
{
    public static void Verify(string name, string text, [CallerFilePath] string testFile = "")
    {
        string approved = Path.Combine(Path.GetDirectoryName(testFile)!, "Approved", name + ".txt");
        string received = Path.ChangeExtension(approved, ".received.txt");
        if (File.Exists(approved) && File.ReadAllText(approved) == text)
        {
            File.Delete(received);
            return;
        }

        File.WriteAllText(received, text);
        Assert.Equal(File.Exists(approved) ? File.ReadAllText(approved) : "", text);
    }
}
