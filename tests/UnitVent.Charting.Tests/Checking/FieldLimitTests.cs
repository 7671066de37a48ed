using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Tests.Checking;

public sealed class FieldLimitTests
{
    /// <summary>Every number field of every kind of entry.</summary>
    public static TheoryData<EntryKind, string> NumberFields()
    {
        var data = new TheoryData<EntryKind, string>();
        foreach (var kind in Enum.GetValues<EntryKind>())
        {
            foreach (var field in EntryFields.Of(EntryTypes.Of(kind)).Where(f => f.Number is not null))
            {
                data.Add(kind, field.Name);
            }
        }

        return data;
    }

    [Theory, MemberData(nameof(NumberFields))]
    public void Limit_OnItsEdge_StandsAndJustOutside_IsRefusedByNameAndLimit(EntryKind kind, string name)
    {
        var field = EntryFields.Of(EntryTypes.Of(kind)).Single(f => f.Name == name);
        var step = field.Kind == FieldKind.Whole ? 1m : 0.001m;

        Assert.DoesNotContain(Verdict(kind, field, (decimal)field.Number!.Low), e => !e.IsAsk);
        Assert.DoesNotContain(Verdict(kind, field, (decimal)field.Number.High), e => !e.IsAsk);
        foreach (var outside in new[] { (decimal)field.Number.Low - step, (decimal)field.Number.High + step })
        {
            var error = Assert.Single(Verdict(kind, field, outside));
            Assert.Equal("limit", error.Code);
            Assert.Contains(field.Label, error.Message);
            Assert.Contains("is outside", error.Message);
        }
    }

    [Theory, MemberData(nameof(NumberFields))]
    public void Question_IsAskedBeyondItsEdge_AndNotOnIt(EntryKind kind, string name)
    {
        var field = EntryFields.Of(EntryTypes.Of(kind)).Single(f => f.Name == name);
        var step = field.Kind == FieldKind.Whole ? 1m : 0.001m;
        foreach (var (edge, beyond) in new[] { (field.Number!.AskBelow, -step), (field.Number.AskAbove, step) }.Where(e => !double.IsNaN(e.Item1)))
        {
            Assert.Empty(Verdict(kind, field, (decimal)edge));
            Assert.Equal("ask." + field.Name, Assert.Single(Verdict(kind, field, (decimal)edge + beyond)).Code);
        }
    }

    [Fact]
    public void Tension_InKilopascals_IsHeldAgainstTheSameLimits()
    {
        var gas = new BloodGas { PCO2 = 34m };

        Assert.Contains(FieldLimits.Verdict(gas, TensionUnit.KPa), e => e is { Field: "pCO2", Code: "limit" } && e.Message.Contains("0.7–33.3 kPa", StringComparison.Ordinal));
        Assert.DoesNotContain(FieldLimits.Verdict(gas, TensionUnit.MmHg), e => e is { Field: "pCO2", Code: "limit" });
    }

    private static List<FieldError> Verdict(EntryKind kind, EntryField field, decimal value)
    {
        var type = EntryTypes.Of(kind);
        var entry = Activator.CreateInstance(type)!;
        object boxed = field.Kind == FieldKind.Whole ? (object)(int)value : value;
        type.GetProperty(field.PropertyName)!.SetValue(entry, boxed);
        return [.. FieldLimits.Verdict(entry).Where(e => e.Field == field.Name)];
    }
}
