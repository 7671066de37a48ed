namespace UnitVent.Simulation.Staff;

/// <summary>Numbers as a person types them: rounded half away from zero, with all decimals written.</summary>
internal static class Typed
{
    public static decimal Number(double value, int decimals = 0) =>
        Math.Round((decimal)value, decimals, MidpointRounding.AwayFromZero) + new decimal(0, 0, 0, false, (byte)decimals);

    public static decimal Within(double value, double low, double high, int decimals = 0) => Number(Math.Clamp(value, low, high), decimals);
}
