using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Cohort;

/// <summary>Numbers of one patient, looked up by name.</summary>
internal readonly record struct Draw(KeyedRandom Random)
{
    public double Between(string what, double low, double high) => double.Lerp(low, high, Random.For(what).Uniform(0));

    public T OneOf<T>(string what, params ReadOnlySpan<T> choices) => choices[(int)(Random.For(what).Uniform(0) * choices.Length)];
}
