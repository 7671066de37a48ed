using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>The form of who a patient is, when admitting and when correcting.</summary>
public sealed class FactsForm
{
    private const string Prefix = "patient.";

    public IReadOnlyList<FormField> Fields { get; } = [.. EntryFields.Of<PatientFacts>().Select(f => new FormField(f))];

    public List<Question> Questions { get; } = [];

    /// <summary>Gets what belongs to no field of the patient.</summary>
    public List<FieldError> General { get; } = [];

    /// <summary>Shows the facts that are to be corrected.</summary>
    public static FactsForm Of(PatientFacts facts)
    {
        var form = new FactsForm();
        foreach (var field in form.Fields)
        {
            field.Text = field.Field.ValueIn(facts) switch
            {
                null => "",
                LocalDate date => NodaTime.Text.LocalDatePattern.Iso.Format(date),
                Enum choice => System.Text.Json.JsonNamingPolicy.CamelCase.ConvertName(choice.ToString()),
                bool yes => yes ? "true" : "false",
                IFormattable number => number.ToString(null, System.Globalization.CultureInfo.InvariantCulture),
                var text => text.ToString()!,
            };
        }

        return form;
    }

    public Result<PatientFacts> Read(Instant now, DateTimeZone zone)
    {
        var read = TypedFields.Read(typeof(PatientFacts), Fields, now, zone);
        return read.Succeeded ? Result<PatientFacts>.Of((PatientFacts)read.Value) : read.As<PatientFacts>();
    }

    /// <summary>Shows what speaks against it: at the fields, as questions, and the rest above.</summary>
    public void Show(IReadOnlyList<FieldError> errors)
    {
        foreach (var field in Fields)
        {
            field.Errors.Clear();
            field.Errors.AddRange(errors.Where(e => !e.IsAsk && (e.Field == field.Field.Name || e.Field == Prefix + field.Field.Name)));
        }

        General.Clear();
        General.AddRange(errors.Where(e => !e.IsAsk && Fields.All(f => !f.Errors.Contains(e))));
        Questions.RemoveAll(q => !q.Yes);
        Questions.AddRange(errors.Where(e => e.IsAsk && Questions.All(q => q.Asked.Code != e.Code)).Select(e => new Question(e)));
    }

    public IReadOnlyList<string> Confirmed => [.. Questions.Where(q => q.Yes).Select(q => q.Asked.Code)];
}
