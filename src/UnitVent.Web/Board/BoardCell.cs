using UnitVent.Charting.Pictures;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>One number of a row: as it is shown, and what there is to say about it.</summary>
/// <param name="Text">The number, or an en dash.</param>
/// <param name="Says">Why there is none, or that it is old or outside its validated range; null when there is nothing to say.</param>
/// <param name="Quiet">Whether it is greyed because it is past its limit.</param>
public sealed record BoardCell(string Text, string? Says = null, bool Quiet = false)
{
    public static BoardCell Of(PictureValue value, int decimals) => value.Value is { } number
        ? new(Format.Number(number, decimals), value.Because)
        : value.State == ValueState.Mode ? new("", null) : new("–", value.Because);
}
