using System.Collections.Immutable;
using CaptureZone.Sites;

namespace CaptureZone.Jobs;

/// <summary>Raised when an input file cannot be used; states everything that is wrong with it.</summary>
/// <param name="complaints">What is wrong, with its places; at least one error among them.</param>
public sealed class InputRefusedException(ImmutableArray<Complaint> complaints) : Exception("The input cannot be used.")
{
    /// <summary>What is wrong, with its places.</summary>
    public ImmutableArray<Complaint> Complaints { get; } = complaints;
}

/// <summary>Raised when a request makes no sense for the site that it is made of.</summary>
/// <param name="message">What is asked, why it cannot be answered, and what to ask instead.</param>
public sealed class RequestException(string message) : Exception(message);

/// <summary>Raised when something cannot be read or written.</summary>
/// <param name="message">What, why, and what to do.</param>
/// <param name="cause">What the system said; null when the program itself declined.</param>
public sealed class AccessException(string message, Exception? cause = null) : Exception(message, cause);
