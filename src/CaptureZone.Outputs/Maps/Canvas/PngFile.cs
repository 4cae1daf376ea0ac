using System.Buffers.Binary;
using System.IO.Compression;
using System.Runtime.InteropServices;
using System.Text;

namespace CaptureZone.Outputs.Maps;

/// <summary>
/// Writes a picture with few colours as a PNG file with a palette (PNG, Third Edition, W3C 2025): a third of the size of one with
/// full colours, and quicker. Colours that share the upper five bits of each channel become the one that prevails among them: flat
/// colours stay as they are, only the smoothed rims of lines move, by less than eight steps of 256.
/// </summary>
internal static class PngFile
{
    private const int MostColors = 256;
    private const int Cells = 1 << 15;

    private static ReadOnlySpan<byte> Signature => [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A];

    /// <summary>The file.</summary>
    /// <param name="rgba">Four bytes per pixel, rows from the top; opaque.</param>
    /// <param name="width">Pixels per row.</param>
    /// <param name="height">Rows.</param>
    public static byte[] Write(ReadOnlySpan<byte> rgba, int width, int height)
    {
        ReadOnlySpan<uint> pixels = MemoryMarshal.Cast<byte, uint>(rgba);
        (uint[] palette, byte[] index) = Palette(pixels);
        using MemoryStream file = new();
        file.Write(Signature);
        byte[] header = new byte[13];
        BinaryPrimitives.WriteInt32BigEndian(header, width);
        BinaryPrimitives.WriteInt32BigEndian(header.AsSpan(4), height);
        (header[8], header[9]) = (8, 3);
        Chunk(file, "IHDR", header);
        Chunk(file, "PLTE", [.. palette.SelectMany(color => new[] { (byte)color, (byte)(color >> 8), (byte)(color >> 16) })]);
        Chunk(file, "IDAT", Compressed(pixels, index, width));
        Chunk(file, "IEND", []);
        return file.ToArray();
    }

    /// <summary>The upper five bits of red, green and blue.</summary>
    private static int Cell(uint color) => (int)(((color >> 3) & 0x1F) | ((color >> 6) & 0x3E0) | ((color >> 9) & 0x7C00));

    /// <summary>The colours kept, and for each cell the one that stands for it.</summary>
    private static (uint[] Palette, byte[] Index) Palette(ReadOnlySpan<uint> pixels)
    {
        int[] count = new int[Cells], lead = new int[Cells];
        uint[] prevailing = new uint[Cells];
        foreach (uint color in pixels)
        {
            int cell = Cell(color);
            count[cell]++;
            if (prevailing[cell] == color)
            {
                lead[cell]++;
            }
            else if (lead[cell] == 0)
            {
                (prevailing[cell], lead[cell]) = (color, 1);
            }
            else
            {
                lead[cell]--;
            }
        }

        int[] used = [.. Enumerable.Range(0, Cells).Where(cell => count[cell] > 0).OrderByDescending(cell => count[cell])];
        uint[] palette = [.. used.Take(MostColors).Select(cell => prevailing[cell])];
        byte[] index = new byte[Cells];
        foreach (int cell in used)
        {
            index[cell] = (byte)Array.IndexOf(palette, palette.MinBy(color => Distance(color, prevailing[cell])));
        }

        return (palette, index);
    }

    private static int Distance(uint a, uint b)
    {
        int red = (byte)a - (byte)b, green = (byte)(a >> 8) - (byte)(b >> 8), blue = (byte)(a >> 16) - (byte)(b >> 16);
        return red * red + green * green + blue * blue;
    }

    private static byte[] Compressed(ReadOnlySpan<uint> pixels, byte[] index, int width)
    {
        using MemoryStream data = new();
        using (ZLibStream zlib = new(data, CompressionLevel.Fastest))
        {
            byte[] row = new byte[1 + width];
            for (int start = 0; start < pixels.Length; start += width)
            {
                for (int x = 0; x < width; x++)
                {
                    row[1 + x] = index[Cell(pixels[start + x])];
                }

                zlib.Write(row);
            }
        }

        return data.ToArray();
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
