using System.Globalization;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Physiology;

namespace UnitVent.Charting.Checking;

/// <summary>Holds each typed member against its own limits: what must be there, what cannot be, what is asked about.</summary>
public static class FieldLimits
{
    /// <summary>Everything that the members' own limits say about what was typed.</summary>
    /// <param name="typed">An object whose members carry <see cref="FieldAttribute"/>.</param>
    /// <param name="tensionUnit">The unit in which tensions were typed.</param>
    public static IEnumerable<FieldError> Verdict(object typed, TensionUnit tensionUnit = TensionUnit.MmHg)
    {
        foreach (var field in EntryFields.Of(typed.GetType()))
        {
            var value = field.ValueIn(typed);
            if (value is null || value is string text && string.IsNullOrWhiteSpace(text))
            {
                if (field.Required)
                {
                    yield return new(field.Name, "missing", $"{field.Label} is needed.");
                }
            }
            else if (value is string words && words.Length > field.MaxLength)
            {
                yield return new(field.Name, "limit.length", $"{field.Label} is {words.Length} characters long; at most {field.MaxLength} are kept.");
            }
            else if (field.Number is { } number && Outside(field, number, value, tensionUnit) is { } error)
            {
                yield return error;
            }
        }
    }

    private static FieldError? Outside(EntryField field, NumberAttribute number, object value, TensionUnit tensionUnit)
    {
        var typed = Convert.ToDecimal(value, CultureInfo.InvariantCulture);
        var inKilopascals = number.IsTension && tensionUnit == TensionUnit.KPa;
        var scale = inKilopascals ? PartialPressure.FromMmHg(1).Kilopascals : 1;
        var unit = inKilopascals ? " kPa" : number.IsTension ? " mmHg" : number.Unit.Length > 0 ? " " + number.Unit : "";
        var canonical = (double)typed / scale;
        if (!(canonical >= number.Low && canonical <= number.High))
        {
            return new(field.Name, "limit", $"{field.Label} {Text(typed)}{unit} is outside {Edge(number.Low)}–{Edge(number.High)}{unit}; check the entry.");
        }

        var unusual = canonical < number.AskBelow ? $"below {Edge(number.AskBelow)}" : canonical > number.AskAbove ? $"above {Edge(number.AskAbove)}" : null;
        return unusual is null ? null : new(field.Name, "ask." + field.Name, $"{field.Label} {Text(typed)}{unit} is unusual ({unusual}{unit}). Is it so?");

        string Edge(double limit) => Text((decimal)Math.Round(limit * scale, inKilopascals ? 1 : 3));
    }

    private static string Text(decimal value) => value.ToString("0.############################", CultureInfo.InvariantCulture).Replace('-', '−');
}
