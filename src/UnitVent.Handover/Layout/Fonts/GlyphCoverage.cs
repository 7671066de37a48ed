using System.Buffers.Binary;

namespace UnitVent.Handover.Layout.Fonts;

/// <summary>The characters a TrueType file can draw, read from its character map.</summary>
/// <remarks>Table directory and <c>cmap</c> formats 4 and 12: ISO/IEC 14496-22 (OpenType), clauses 4.3 and 5.2.1.</remarks>
internal static class GlyphCoverage
{
    private const int DirectoryStart = 12;
    private const int DirectoryEntryLength = 16;
    private const int GroupStart = 16;
    private const int GroupLength = 12;

    /// <summary>Reads the code points that have a glyph; none for a file that is not a TrueType font with outlines.</summary>
    public static IReadOnlySet<int> Read(string path)
    {
        var characters = new HashSet<int>();
        try
        {
            ReadOnlySpan<byte> font = File.ReadAllBytes(path);
            if (Table(font, "glyf"u8) is not null && Table(font, "cmap"u8) is { } map)
            {
                AddBestSubtable(font[map..], characters);
            }
        }
        catch (Exception damaged) when (damaged is IOException or UnauthorizedAccessException or ArgumentOutOfRangeException or OverflowException)
        {
            characters.Clear();
        }

        return characters;
    }

    private static int? Table(ReadOnlySpan<byte> font, ReadOnlySpan<byte> tag)
    {
        for (var i = 0; i < UInt16(font, 4); i++)
        {
            var entry = font.Slice(DirectoryStart + (i * DirectoryEntryLength), DirectoryEntryLength);
            if (entry[..4].SequenceEqual(tag))
            {
                return Int32(entry, 8);
            }
        }

        return null;
    }

    private static void AddBestSubtable(ReadOnlySpan<byte> map, HashSet<int> characters)
    {
        var (best, bestFormat) = (0, 0);
        for (var i = 0; i < UInt16(map, 2); i++)
        {
            var offset = Int32(map, 4 + (i * 8) + 4);
            var format = UInt16(map, offset);
            if (format is 4 or 12 && format > bestFormat)
            {
                (best, bestFormat) = (offset, format);
            }
        }

        if (bestFormat == 12)
        {
            AddGroups(map[best..], characters);
        }
        else if (bestFormat == 4)
        {
            AddSegments(map[best..], characters);
        }
    }

    private static void AddGroups(ReadOnlySpan<byte> table, HashSet<int> characters)
    {
        for (var i = 0; i < Int32(table, 12); i++)
        {
            var group = table.Slice(GroupStart + (i * GroupLength), GroupLength);
            var (first, last, glyph) = (Int32(group, 0), Int32(group, 4), Int32(group, 8));
            for (var code = glyph == 0 ? first + 1 : first; code <= last; code++)
            {
                characters.Add(code);
            }
        }
    }

    private static void AddSegments(ReadOnlySpan<byte> table, HashSet<int> characters)
    {
        int doubled = UInt16(table, 6);
        for (var segment = 0; segment < doubled; segment += 2)
        {
            var end = 14 + segment;
            var (start, delta, range) = (end + 2 + doubled, end + 2 + (2 * doubled), end + 2 + (3 * doubled));
            for (int code = UInt16(table, start); code <= UInt16(table, end) && code < 0xFFFF; code++)
            {
                var glyph = UInt16(table, range) is var skip and not 0
                    ? UInt16(table, range + skip + (2 * (code - UInt16(table, start))))
                    : (code + UInt16(table, delta)) % 0x10000;
                if (glyph != 0)
                {
                    characters.Add(code);
                }
            }
        }
    }

    private static ushort UInt16(ReadOnlySpan<byte> bytes, int at) => BinaryPrimitives.ReadUInt16BigEndian(bytes[at..]);

    private static int Int32(ReadOnlySpan<byte> bytes, int at) => BinaryPrimitives.ReadInt32BigEndian(bytes[at..]);
}
