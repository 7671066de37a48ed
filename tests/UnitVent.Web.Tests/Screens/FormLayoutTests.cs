using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class FormLayoutTests
{
    public static TheoryData<EntryKind, VentilationMode?> EveryForm
    {
        get
        {
            var forms = new TheoryData<EntryKind, VentilationMode?>();
            foreach (var kind in Enum.GetValues<EntryKind>())
            {
                foreach (var mode in Enum.GetValues<VentilationMode>())
                {
                    forms.Add(kind, mode);
                }
            }

            return forms;
        }
    }

    [Theory, MemberData(nameof(EveryForm))]
    public void Layout_OfAnyForm_ShowsEveryFieldOnce(EntryKind kind, VentilationMode? mode)
    {
        var shown = FormLayout.Of(kind, mode).SelectMany(g => g.Fields).Order(StringComparer.Ordinal);
        var fields = kind == EntryKind.SettingChange ? SettingCheck.FieldsOf(mode!.Value) : EntryFields.Of(EntryTypes.Of(kind)).Select(f => f.Name);

        Assert.Equal(fields.Order(StringComparer.Ordinal), shown);
    }

    [Fact]
    public void Layout_OfSettingsWithoutMode_AsksForTheModeFirst() =>
        Assert.Equal(["effectiveAt", "mode"], FormLayout.Of(EntryKind.SettingChange, null).SelectMany(g => g.Fields));

    [Fact]
    public void Layout_OfACheckInAprv_FoldsPlateauAwayAndKeepsFlows()
    {
        var groups = FormLayout.Of(EntryKind.VentilatorCheck, VentilationMode.Aprv);

        Assert.True(groups.Single(g => g.Fields.Contains("plateauPressureCmH2O")).Folded);
        Assert.False(groups.Single(g => g.Fields.Contains("endReleaseFlowLMin")).Folded);
    }
}
