using System.Buffers.Binary;
using NodaTime;

namespace UnitVent.Simulation.Randomness;

/// <summary>Ids as RFC 9562 section 5.7 lays them out (UUID version 7), with seeded instead of random bits: the same entry always gets the same id.</summary>
public static class SeededId
{
    public static Guid At(Instant at, KeyedRandom random)
    {
        Span<byte> bytes = stackalloc byte[16];
        BinaryPrimitives.WriteUInt64BigEndian(bytes, (ulong)at.ToUnixTimeMilliseconds() << 16);
        BinaryPrimitives.WriteUInt64BigEndian(bytes[8..], random.Bits(0));
        BinaryPrimitives.WriteUInt16BigEndian(bytes[6..], (ushort)(0x7000 | (random.Bits(1) & 0x0FFF)));
        bytes[8] = (byte)(0x80 | (bytes[8] & 0x3F));
        return new Guid(bytes, bigEndian: true);
    }
}
