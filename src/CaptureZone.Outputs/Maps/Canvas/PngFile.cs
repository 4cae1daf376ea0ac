using System.Buffers.Binary;
using System.IO.Compression;
using System.Runtime.CompilerServices;
using System.Text;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>
/// Writes a picture with few colours as a PNG file with a palette (PNG, Third Edition, W3C 2025): half the size of one with full
/// colours, and quicker. Colours that share the upper five bits of each channel become one: flat colours are named beforehand and
/// stay as they are; only the smoothed rims of lines move, by a few steps of 256.
/// </summary>
internal sealed class PngFile
{
    private const int MostColors = 256;
    private const int Cells = 1 << 15;
    private const short Unknown = -1;
    private const byte BitDepth = 8, PaletteColor = 3;

    private readonly int _width;
    private readonly int _height;
    private readonly List<uint> _palette = new(MostColors);
    private readonly short[] _index = new short[Cells];
    private readonly MemoryStream _data = new();
    private readonly ZLibStream _zlib;

    /// <summary>Begins a file.</summary>
    /// <param name="width">Pixels per row.</param>
    /// <param name="height">Rows.</param>
    /// <param name="flat">Colours that stay exactly as they are.</param>
    public PngFile(int width, int height, IEnumerable<SKColor> flat)
    {
        _width = width;
        _height = height;
        _zlib = new ZLibStream(_data, CompressionLevel.Fastest, leaveOpen: true);
        Array.Fill(_index, Unknown);
        foreach (SKColor color in flat)
        {
            IndexOf((uint)(color.Red | (color.Green << 8) | (color.Blue << 16)));
        }
    }

    private static ReadOnlySpan<byte> Signature => [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A];

    /// <summary>Adds rows below those that are there.</summary>
    /// <param name="pixels">Whole rows; red in the lowest byte, then green and blue; opaque.</param>
    public void Add(ReadOnlySpan<uint> pixels)
    {
        byte[] row = new byte[1 + _width];
        for (int start = 0; start < pixels.Length; start += _width)
        {
            Translate(pixels.Slice(start, _width), row.AsSpan(1));
            _zlib.Write(row);
        }
    }

    /// <summary>The file, when all rows are there.</summary>
    public byte[] ToArray()
    {
        _zlib.Dispose();
        using MemoryStream file = new();
        file.Write(Signature);
        byte[] header = new byte[13];
        BinaryPrimitives.WriteInt32BigEndian(header, _width);
        BinaryPrimitives.WriteInt32BigEndian(header.AsSpan(4), _height);
        (header[8], header[9]) = (BitDepth, PaletteColor);
        Chunk(file, "IHDR", header);
        Chunk(file, "PLTE", [.. _palette.SelectMany(color => new[] { (byte)color, (byte)(color >> 8), (byte)(color >> 16) })]);
        Chunk(file, "IDAT", _data.ToArray());
        Chunk(file, "IEND", []);
        return file.ToArray();
    }

    /// <summary>The upper five bits of red, green and blue.</summary>
    private static int Cell(uint color) => (int)(((color >> 3) & 0x1F) | ((color >> 6) & 0x3E0) | ((color >> 9) & 0x7C00));

    private static int Distance(uint a, uint b)
    {
        int red = (byte)a - (byte)b, green = (byte)(a >> 8) - (byte)(b >> 8), blue = (byte)(a >> 16) - (byte)(b >> 16);
        return red * red + green * green + blue * blue;
    }

    /// <summary>A picture's inner loop: compiled for speed at once, as there is no time to warm up.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void Translate(ReadOnlySpan<uint> pixels, Span<byte> indexes)
    {
        short[] known = _index;
        for (int x = 0; x < pixels.Length; x++)
        {
            short index = known[Cell(pixels[x])];
            indexes[x] = (byte)(index == Unknown ? IndexOf(pixels[x]) : index);
        }
    }

    /// <summary>Place of a colour in the palette: a new one while there is room, else the nearest.</summary>
    private short IndexOf(uint color)
    {
        ref short index = ref _index[Cell(color)];
        if (index == Unknown)
        {
            if (_palette.Count < MostColors)
            {
                _palette.Add(color);
                index = (short)(_palette.Count - 1);
            }
            else
            {
                index = (short)_palette.IndexOf(_palette.MinBy(other => Distance(other, color)));
            }
        }

        return index;
    }

    private static void Chunk(Stream file, string type, ReadOnlySpan<byte> data)
    {
        byte[] chunk = new byte[data.Length + 12];
        BinaryPrimitives.WriteInt32BigEndian(chunk, data.Length);
        Encoding.ASCII.GetBytes(type, chunk.AsSpan(4));
        data.CopyTo(chunk.AsSpan(8));
        BinaryPrimitives.WriteUInt32BigEndian(chunk.AsSpan(8 + data.Length), Crc(chunk.AsSpan(4, 4 + data.Length)));
        file.Write(chunk);
    }

    /// <summary>The check sum that the PNG standard names (its annex D).</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static uint Crc(ReadOnlySpan<byte> bytes)
    {
        uint crc = uint.MaxValue;
        foreach (byte next in bytes)
        {
            crc ^= next;
            for (int bit = 0; bit < 8; bit++)
            {
                crc = (crc >> 1) ^ ((crc & 1) * 0xEDB88320);
            }
        }

        return ~crc;
    }
}
