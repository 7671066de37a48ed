using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Staff;

/// <summary>What instruments make of the truth at one moment. Each quantity has noise of its own; the same quantity asked twice reads the same.</summary>
/// <remarks>
/// Gases: within-patient variation of Chest 1983;84:14-18 and J Clin Monit 1992;8:111-115, in which most of the spread is between samples.
/// Pressures, flows and volumes: common practice.
/// </remarks>
internal sealed class Instruments(KeyedRandom moment)
{
    public double PaO2(double mmHg) => Scaled("PaO2", mmHg, 0.045);

    public double PaCO2(double mmHg) => Scaled("PaCO2", mmHg, 0.025);

    public double PH(double pH) => Shifted("pH", pH, 0.006);

    public double SpO2(double percent) => Math.Min(100, Shifted("SpO2", percent, 0.6));

    public double EtCO2(double mmHg) => Scaled("EtCO2", mmHg, 0.024);

    public double Flow(string which, double litresPerMinute) => Scaled(which, litresPerMinute, 0.03);

    public double Volume(string which, double volume) => Scaled(which, volume, 0.03);

    public double Rate(string which, double perMinute) => Scaled(which, perMinute, 0.03);

    public double Pressure(string which, double cmH2O) => Scaled(which, cmH2O, 0.01);

    public double Shifted(string which, double value, double deviation) => value + (deviation * moment.For(which).Normal(0));

    private double Scaled(string which, double value, double coefficient) => value * (1 + (coefficient * moment.For(which).Normal(0)));
}
