namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>Left open for the licensed professional.</summary>
internal static class SignatureSection
{
    public static IEnumerable<Block> Of() =>
    [
        new Heading(1, "Licensed professional"),
        new Paragraph(
            "Left open. This memo is a calculation until a licensed professional has reviewed it and taken responsibility for it below."),
        new Form([new("Name", ""), new("Licence number and state", ""), new("Signature", ""), new("Date", ""), new("Seal", "")]),
    ];
}
