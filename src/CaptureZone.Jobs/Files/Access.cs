using System.Security;

namespace CaptureZone.Jobs.Files;

/// <summary>Turns what the system says about files into what a person can act on.</summary>
public static class Access
{
    /// <summary>Windows' code for a file that another program holds open.</summary>
    private const int SharingViolation = unchecked((int)0x80070020);

    /// <summary>Unix's EAGAIN, as .NET passes it on, for a file that another program has locked.</summary>
    private const int WouldBlock = 11;

    /// <summary>Does something with a file or folder.</summary>
    /// <typeparam name="T">What it gives.</typeparam>
    /// <param name="path">The file or folder, as the user gave it.</param>
    /// <param name="action">What is done.</param>
    /// <exception cref="AccessException">The system did not allow it.</exception>
    public static T Try<T>(string path, Func<T> action)
    {
        try
        {
            return action();
        }
        catch (Exception failure) when (IsRefusal(failure))
        {
            throw new AccessException($"{path}: {Reason(failure)}", failure);
        }
    }

    /// <summary>Does something with a file or folder.</summary>
    /// <param name="path">The file or folder, as the user gave it.</param>
    /// <param name="action">What is done.</param>
    /// <exception cref="AccessException">The system did not allow it.</exception>
    public static void Try(string path, Action action) =>
        Try(path, () =>
        {
            action();
            return true;
        });

    /// <summary>Whether an exception is the system's refusal to read or write.</summary>
    /// <param name="failure">The exception.</param>
    public static bool IsRefusal(Exception failure) =>
        failure is IOException or UnauthorizedAccessException or SecurityException;

    /// <summary>The system's refusal in words.</summary>
    /// <param name="failure">What the system said.</param>
    public static string Reason(Exception failure) => failure switch
    {
        FileNotFoundException => "there is no such file",
        DirectoryNotFoundException => "there is no such folder",
        PathTooLongException => "the path is too long",
        UnauthorizedAccessException or SecurityException => "no permission to read or write here",
        IOException { HResult: SharingViolation or WouldBlock } => "in use by another program; close it there and try again",
        _ => failure.Message,
    };
}
