using System.Text.Json;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Tests.Fields;

public sealed class FieldReaderTests
{
    private const string Gas = """{"drawnAt":"2026-03-10T11:30:00+01:00","specimen":"arterial","tensionUnit":"mmHg","pH":7.40,"pCO2":40,"pO2":80""";

    public static TheoryData<string, string, string, string> WrongShapes => new()
    {
        { ""","surprise":1}""", "surprise", "shape.unknown", "a member that does not exist" },
        { ""","lactateMmolL":"2"}""", "lactateMmolL", "shape.number", "a text instead of a number" },
        { ""","lactateMmolL":1e309}""", "lactateMmolL", "shape.number", "a number beyond all numbers" },
        { ""","bicarbonateKind":"tail"}""", "bicarbonateKind", "shape.choice", "an unknown choice" },
        { ""","bicarbonateKind":"Actual"}""", "bicarbonateKind", "shape.choice", "choices are spelled exactly" },
        { ""","bicarbonateKind":0}""", "bicarbonateKind", "shape.choice", "a number instead of a choice" },
        { ""","temperatureCorrected":"yes"}""", "temperatureCorrected", "shape.yesno", "a text instead of yes or no" },
        { ""","site":5}""", "site", "shape.text", "a number instead of a text" },
        { ""","PH":7.4}""", "PH", "shape.unknown", "names are spelled exactly" },
    };

    [Theory, MemberData(nameof(WrongShapes))]
    public void Read_WrongShape_NamesTheMember(string tail, string field, string code, string reason)
    {
        var result = Read(Gas + tail);

        Assert.True(result.Refusal == Refusal.Shape && result.Errors.Any(e => e.Field == field && e.Code == code), reason);
    }

    [Fact]
    public void Read_ManyMistakes_SaysThemAllAtOnce()
    {
        var result = Read("""{"specimen":"tail","surprise":1,"drawnAt":"yesterday"}""");

        Assert.Equal(["surprise", "drawnAt", "specimen", "tensionUnit", "pH", "pCO2"], result.Errors.Select(e => e.Field));
    }

    [Fact]
    public void Read_AGas_KeepsTrailingZerosAndLeavesOutWhatWasNotRecorded()
    {
        var gas = Assert.IsType<BloodGas>(Read(Gas + "}").Value);

        Assert.Equal("7.40", gas.PH!.Value.ToString(System.Globalization.CultureInfo.InvariantCulture));
        Assert.Null(gas.BaseExcessMmolL);
        Assert.Contains("\"pH\":7.40", JsonSerializer.Serialize<object>(gas, ChartJson.Options), StringComparison.Ordinal);
        Assert.DoesNotContain("baseExcess", JsonSerializer.Serialize<object>(gas, ChartJson.Options), StringComparison.Ordinal);
    }

    [Fact]
    public void EveryEntryType_WrittenAndRead_IsTheSame()
    {
        foreach (var kind in Enum.GetValues<EntryKind>())
        {
            var type = EntryTypes.Of(kind);
            var entry = (Entry)Activator.CreateInstance(type)!;
            foreach (var field in EntryFields.Of(type))
            {
                type.GetProperty(field.PropertyName)!.SetValue(entry, Sample(field));
            }

            var json = JsonSerializer.SerializeToElement(entry, type, ChartJson.Options);
            Assert.Equal(entry, FieldReader.Read(type, json).Value);
        }
    }

    private static object Sample(EntryField field) => field.Kind switch
    {
        FieldKind.Number => (decimal)field.Number!.Low + 0.10m,
        FieldKind.Whole => (int)field.Number!.Low,
        FieldKind.YesNo => true,
        FieldKind.Time => Chart.Ago(1),
        FieldKind.Choice => Enum.GetValues(field.ChoiceType!).GetValue(field.Choices.Count - 1)!,
        _ => "text",
    };

    private static Result<object> Read(string json) => FieldReader.Read(typeof(BloodGas), JsonDocument.Parse(json).RootElement);
}
