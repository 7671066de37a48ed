using Microsoft.AspNetCore.Components;
using UnitVent.Charting.Bands;

namespace UnitVent.Web.Board;

/// <summary>The mark of each band: one shape, one ink. The word stands beside it.</summary>
public static class MarkShape
{
    private const string Frame = "<svg class=\"mark\" viewBox=\"0 0 16 16\" width=\"16\" height=\"16\" aria-hidden=\"true\" focusable=\"false\">";

    public static MarkupString Of(Band band) => new(Frame + band switch
    {
        Band.LookNow => "<rect x=\"1\" y=\"1\" width=\"14\" height=\"14\" fill=\"currentColor\"/>",
        Band.LookThisHour => "<rect x=\"1.75\" y=\"1.75\" width=\"12.5\" height=\"12.5\" fill=\"none\" stroke=\"currentColor\" stroke-width=\"1.5\"/><rect x=\"1\" y=\"8\" width=\"14\" height=\"7\" fill=\"currentColor\"/>",
        Band.NotKnown => "<rect x=\"1.75\" y=\"1.75\" width=\"12.5\" height=\"12.5\" fill=\"none\" stroke=\"currentColor\" stroke-width=\"1.5\" stroke-dasharray=\"3 2.2\"/>",
        Band.NothingRaised => "<circle cx=\"8\" cy=\"8\" r=\"6\" fill=\"none\" stroke=\"currentColor\" stroke-width=\"1.5\"/>",
    } + "</svg>");

    public static string Word(Band band) => band switch
    {
        Band.LookNow => "Look now",
        Band.LookThisHour => "Look this hour",
        Band.NotKnown => "Not known",
        Band.NothingRaised => "Nothing raised",
    };
}
