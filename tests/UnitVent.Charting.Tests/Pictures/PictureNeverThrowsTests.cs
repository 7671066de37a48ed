using CsCheck;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Pictures;

public sealed class PictureNeverThrowsTests
{
    private static readonly EntryKind[] Kinds = [EntryKind.SettingChange, EntryKind.BloodGas, EntryKind.VentilatorCheck, EntryKind.BreathingCheck];

    /// <summary>Whatever lies within the fields' limits, in whatever combination, gives a value or a sentence.</summary>
    [Fact]
    public void Picture_OfAnyEntriesWithinTheirLimits_AnswersWithStateAndSentence() =>
        Gen.Select(Gen.Int[0, 3], Gen.Int[0, 100], Gen.Double[0, 1].Array[60], Gen.Int[0, 2000]).Array[0, 12].Sample(
            drawn =>
            {
                var chart = new Chart();
                foreach (var (kind, density, fractions, minutes) in drawn)
                {
                    var entry = Any(Kinds[kind], density, fractions, minutes);
                    if (FieldLimits.Verdict(entry, (entry as BloodGas)?.TensionUnit ?? TensionUnit.MmHg).All(e => e.IsAsk))
                    {
                        chart.Add(entry);
                    }
                }

                var picture = chart.Picture();
                Assert.All(picture.Values.Values, v => Assert.Equal(v.State is ValueState.Ok or ValueState.Validity, v.Value is not null));
                Assert.All(picture.Values.Values.Where(v => v.State != ValueState.Ok), v => Assert.False(string.IsNullOrEmpty(v.Because)));
                Assert.All(picture.Values.Values.Where(v => v.Kind != ValueKind.Measured), v => Assert.Equal(v.Value is null, v.Working is null));
            },
            iter: 2000);

    private static Entry Any(EntryKind kind, int density, double[] fractions, int minutesAgo)
    {
        var type = EntryTypes.Of(kind);
        var entry = (Entry)Activator.CreateInstance(type)!;
        var next = 0;
        foreach (var field in EntryFields.Of(type))
        {
            var fraction = fractions[next++ % fractions.Length];
            if (field.Required || fraction * 100 < density)
            {
                type.GetProperty(field.PropertyName)!.SetValue(entry, Value(field, fractions[(next * 7) % fractions.Length], minutesAgo));
            }
        }

        return entry;
    }

    private static object Value(EntryField field, double fraction, int minutesAgo) => field.Kind switch
    {
        FieldKind.Number => (decimal)Math.Round(field.Number!.Low + fraction * (field.Number.High - field.Number.Low), 3),
        FieldKind.Whole => (int)(field.Number!.Low + fraction * (field.Number.High - field.Number.Low)),
        FieldKind.YesNo => fraction > 0.5,
        FieldKind.Time => Chart.Ago(minutesAgo),
        FieldKind.Choice => Enum.GetValues(field.ChoiceType!).GetValue((int)(fraction * 0.999 * field.Choices.Count))!,
        _ => "x",
    };
}
