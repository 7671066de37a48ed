using System.Collections;
using System.Reflection;
using CsCheck;

namespace UnitVent.Physiology.Tests;

public sealed class EquationConventionTests
{
    private static readonly double[] Awkward = [double.NaN, double.PositiveInfinity, double.NegativeInfinity, 0, 1, -1, 0.5, double.MaxValue, double.Epsilon];

    /// <summary>For every type an equation takes: its whole range, its ends, and the default that no one recorded.</summary>
    private static Dictionary<Type, Gen<object>> Arguments => new()
    {
        [typeof(double)] = Gen.OneOf<double>(Gen.OneOf<double>(Awkward), Gen.Double[-10, 200]).Select(x => (object)x),
        [typeof(AirwayPressure)] = Range(-20, 150, AirwayPressure.FromCmH2O),
        [typeof(PartialPressure)] = Range(0, 1000, PartialPressure.FromMmHg),
        [typeof(BreathTime)] = Range(0, 60, BreathTime.FromSeconds),
        [typeof(GasVolume)] = Range(0, 5000, GasVolume.FromMillilitres),
        [typeof(GasFlow)] = Range(0, 300, GasFlow.FromLitresPerMinute),
        [typeof(MinuteVentilation)] = Range(0, 60, MinuteVentilation.FromLitresPerMinute),
        [typeof(BreathRate)] = Range(0, 150, BreathRate.FromPerMinute),
        [typeof(BodyMass)] = Range(1e-9, 700, BodyMass.FromKilograms),
        [typeof(BodyHeight)] = Range(120, 230, BodyHeight.FromCentimetres),
        [typeof(OxygenFraction)] = Range(0.18, 1, OxygenFraction.FromFraction),
        [typeof(Saturation)] = Range(0, 100, Saturation.FromPercent),
        [typeof(Compliance)] = Range(1e-9, 500, Compliance.FromMlPerCmH2O),
        [typeof(Resistance)] = Range(0, 20000, Resistance.FromCmH2OSecondsPerLitre),
        [typeof(HaemoglobinConcentration)] = Range(0, 30, HaemoglobinConcentration.FromGramsPerDecilitre),
        [typeof(Bicarbonate)] = Range(0, 100, Bicarbonate.FromMmolPerLitre),
        [typeof(BloodPH)] = Range(6, 8.5, BloodPH.FromPH),
        [typeof(BarometricPressure)] = Range(200, 900, BarometricPressure.FromMmHg),
        [typeof(TimeSpan)] = Range(0, 30, x => TimeSpan.FromDays(x)),
        [typeof(TimeSpan?)] = Range(0, 40, x => TimeSpan.FromDays(x)).Select(Gen.Bool, (x, known) => known ? x : null!),
        [typeof(IReadOnlyList<VentilatedSpell>)] = Gen.Double[0, 20].Array[0, 3].Select(days => (object)days
            .Select((day, i) => new VentilatedSpell(TimeSpan.FromDays(i * day), TimeSpan.FromDays((i * day) + day))).ToArray()),
    };

    private static readonly Assembly Physiology = typeof(AirwayPressure).Assembly;

    public static TheoryData<string, string> Equations
        => [.. StaticClasses().SelectMany(type => Methods(type).Select(method => (type.Name, method.Name)))];

    [Theory, MemberData(nameof(Equations))]
    public void Equation_OnAnythingItAccepts_ReturnsFiniteNumbersOrRefuses(string type, string name)
    {
        var method = Methods(StaticClasses().Single(t => t.Name == type)).Single(m => m.Name == name);
        var arguments = method.GetParameters().Select(p => ArgumentOf(p.ParameterType)).ToArray();

        Combine(arguments).Sample(args => IsFinite(Invoke(method, args)), iter: 2000);
    }

    [Fact]
    public void Physiology_ReferencesTheBaseLibraryOnly()
        => Assert.All(Physiology.GetReferencedAssemblies(), reference => Assert.Matches(@"^(System\.|netstandard$)", reference.Name));

    private static IEnumerable<Type> StaticClasses() => Physiology.GetExportedTypes().Where(type => type.IsAbstract && type.IsSealed);

    private static MethodInfo[] Methods(Type type) => type.GetMethods(BindingFlags.Public | BindingFlags.Static);

    /// <summary>A record of the core is made of what its constructor takes.</summary>
    private static Gen<object> ArgumentOf(Type type)
        => Arguments.TryGetValue(type, out var known) ? known
            : type.IsEnum ? Gen.OneOf<object>([.. Enum.GetValues(type).Cast<object>()])
            : Combine([.. type.GetConstructors()[0].GetParameters().Select(p => ArgumentOf(p.ParameterType))])
                .Select(values => Activator.CreateInstance(type, values)!);

    private static Gen<object> Range<T>(double lowest, double highest, Func<double, T> create)
        where T : struct
        => Gen.Frequency<T>(
            (6, Gen.Double[lowest, highest].Select(create)),
            (2, Gen.OneOf<T>(create(lowest), create(lowest == 0 ? double.Epsilon : lowest), create(highest), default)))
            .Select(x => (object)x);

    private static Gen<object[]> Combine(Gen<object>[] arguments)
        => arguments.Aggregate(Gen.Const(Array.Empty<object>()), (all, next) => all.Select(next, (list, value) => (object[])[.. list, value]));

    private static object? Invoke(MethodInfo method, object[] arguments)
    {
        try
        {
            return method.Invoke(null, BindingFlags.DoNotWrapExceptions, null, arguments, null);
        }
        catch (ArgumentOutOfRangeException)
        {
            return null;
        }
    }

    private static bool IsFinite(object? result) => result switch
    {
        double number => double.IsFinite(number),
        IEnumerable many => many.Cast<object?>().All(IsFinite),
        Enum => true,
        { } part when part.GetType().Assembly == Physiology
            => part.GetType().GetProperties().Where(p => p.GetMethod is { IsStatic: false }).All(p => IsFinite(p.GetValue(part))),
        _ => true,
    };
}
