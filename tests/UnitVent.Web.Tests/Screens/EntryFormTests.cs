using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class EntryFormTests
{
    [Fact]
    public void Gas_TypedFromASlip_BecomesTheEntryAsTyped()
    {
        var form = FormOpening.Empty(EntryKind.BloodGas, ScreenChart.Picture());
        Type(form, ("specimen", "arterial"), ("drawnAt", "0540"), ("pH", "7.40"), ("pCO2", "45"), ("pO2", "71"));

        var gas = (BloodGas)form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Body;

        Assert.Equal("7.40", gas.PH!.Value.ToString(System.Globalization.CultureInfo.InvariantCulture));
        Assert.Equal(ScreenChart.Ago(505), gas.DrawnAt);
        Assert.Null(gas.FiO2);
        Assert.Equal(TensionUnit.MmHg, gas.TensionUnit);
    }

    [Fact]
    public void Gas_WithoutSpecimenAndWithLetters_IsRefusedAtBothFieldsAtOnce()
    {
        var form = FormOpening.Empty(EntryKind.BloodGas, ScreenChart.Picture());
        Type(form, ("pH", "7,4"), ("pCO2", "45"));

        form.Show(form.Read(ScreenChart.Now, ScreenChart.Berlin).Errors);

        Assert.Equal("typed", Assert.Single(form["pH"].Errors).Code);
        Assert.Equal("missing", Assert.Single(form["specimen"].Errors).Code);
        Assert.Equal("7,4", form["pH"].Text);
    }

    [Fact]
    public void OxygenFraction_TypedAsPercentage_IsTheFraction()
    {
        var form = FormOpening.Empty(EntryKind.BloodGas, ScreenChart.Picture());
        Type(form, ("specimen", "arterial"), ("pH", "7.40"), ("pCO2", "45"), ("pO2", "71"), ("fiO2", "45"));
        form["fiO2"].InPercent = true;

        Assert.Equal(0.45m, ((BloodGas)form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Body).FiO2);
        Assert.Equal("45", form["fiO2"].Text);
    }

    [Fact]
    public void SettingChange_WithOneNewValue_IsStoredWholeAndSaysWhatItCarries()
    {
        var form = FormOpening.Empty(EntryKind.SettingChange, ScreenChart.Picture(ScreenChart.Aprv(300)));
        Type(form, ("pHighCmH2O", "26"));

        var settings = (SettingChange)form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Body;

        Assert.Equal((26m, 5m, 4.5m, 0.5m, 0.5m), (settings.PHighCmH2O, settings.PLowCmH2O, settings.THighS, settings.TLowS, settings.FiO2));
        Assert.Equal(TubeCompensation.On, settings.TubeCompensation);
        Assert.True(form["tLowS"].Carries);
        Assert.Equal("", form["tLowS"].Text);
    }

    [Fact]
    public void SettingChange_WithASettingNoLongerSet_LeavesItOut()
    {
        var form = FormOpening.Empty(EntryKind.SettingChange, ScreenChart.Picture(ScreenChart.Aprv(300)));
        form["tubeCompensation"].NoLongerSet = true;

        Assert.Null(((SettingChange)form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Body).TubeCompensation);
    }

    [Fact]
    public void SettingChange_ToAnotherMode_CarriesOnlyFiO2()
    {
        var picture = ScreenChart.Picture(ScreenChart.Aprv(300));
        var form = FormOpening.Empty(EntryKind.SettingChange, picture);
        Type(form, ("mode", "cpap"), ("peepCmH2O", "10"));
        LastValues.Give(form, picture);

        var settings = (SettingChange)form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Body;

        Assert.Equal((VentilationMode.Cpap, 10m, 0.5m), (settings.Mode, settings.PeepCmH2O, settings.FiO2));
        Assert.Null(settings.TubeCompensation);
        Assert.Null(settings.PHighCmH2O);
    }

    [Fact]
    public void Correction_WithNothingChanged_IsTheSameToTheLastSecondAndDigit()
    {
        var gas = ScreenChart.Gas(30, 71m, 7.40m) with { DrawnAt = ScreenChart.Ago(30) + NodaTime.Duration.FromSeconds(17) };
        var entry = ScreenChart.Picture(gas).Window.Standing[0];
        var form = FormOpening.Correction(entry, ScreenChart.Berlin);
        form.CorrectionReason = "wrong patient's slip";

        var corrected = form.Read(ScreenChart.Now, ScreenChart.Berlin).Value;

        Assert.Equal(gas, corrected.Body);
        Assert.Equal((entry.Id, "wrong patient's slip"), (corrected.Corrects, corrected.CorrectionReason));
    }

    [Fact]
    public void Question_AnsweredWithYes_GoesWithTheNextAttemptUntilTheValueIsTypedAnew()
    {
        var form = FormOpening.Empty(EntryKind.BloodGas, ScreenChart.Picture());
        Type(form, ("specimen", "arterial"), ("pH", "6.95"), ("pCO2", "45"), ("pO2", "71"));
        form.Show([new FieldError("pH", "ask.pH", "pH 6.95 is unusual. Is it so?")]);
        form.Questions.Single().Yes = true;

        Assert.Equal(["ask.pH"], form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Confirmed);

        form.Retyped(form["pH"]);
        Assert.Empty(form.Read(ScreenChart.Now, ScreenChart.Berlin).Value.Confirmed);
    }

    private static void Type(EntryForm form, params (string Field, string Text)[] typed)
    {
        foreach (var (field, text) in typed)
        {
            form[field].Text = text;
        }
    }
}
