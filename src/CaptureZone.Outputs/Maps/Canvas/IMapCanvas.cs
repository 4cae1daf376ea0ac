namespace CaptureZone.Outputs.Maps;

/// <summary>What a map is drawn on. One routine draws every map; a format is an implementation of this.</summary>
internal interface IMapCanvas
{
    /// <summary>Begins a named layer; ends the one before.</summary>
    /// <param name="name">Its name: lower case, words joined by hyphens.</param>
    void Layer(string name);

    /// <summary>Fills a shape.</summary>
    /// <param name="shape">The shape.</param>
    /// <param name="color">The colour.</param>
    void Fill(Shape shape, SkiaSharp.SKColor color);

    /// <summary>Draws a shape's lines.</summary>
    /// <param name="shape">The shape.</param>
    /// <param name="pen">How.</param>
    void Stroke(Shape shape, Pen pen);

    /// <summary>Draws one line of text.</summary>
    /// <param name="text">The text.</param>
    void Write(MapText text);

    /// <summary>Draws within a shape only.</summary>
    /// <param name="within">The shape.</param>
    /// <param name="draw">What is drawn.</param>
    void Clipped(Shape within, Action draw);
}
