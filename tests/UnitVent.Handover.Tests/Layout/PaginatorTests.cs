using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Tests.Layout;

public sealed class PaginatorTests
{
    private const double PageHeight = 100;

    [Fact]
    public void Pieces_KeptTogether_MoveToTheNextPageTogether()
    {
        var pages = Paginator.Spread([Of(80), Of(10) with { KeepWithNext = true }, Of(20)], PageHeight);

        Assert.Equal([1, 2], pages.Select(page => page.Count));
    }

    [Fact]
    public void Pieces_KeptTogetherButHigherThanAPage_AreSpreadAllTheSame()
    {
        var pages = Paginator.Spread([Of(60) with { KeepWithNext = true }, Of(60) with { KeepWithNext = true }, Of(60)], PageHeight);

        Assert.Equal(3, pages.Count);
    }

    [Fact]
    public void Space_AtTheTopOfAPage_IsDropped()
    {
        var pages = Paginator.Spread([Of(95), Piece.Space(10) with { KeepWithNext = true }, Of(20)], PageHeight);

        Assert.Equal(0, Assert.Single(pages[1]).Top);
    }

    [Fact]
    public void Head_IsRepeatedOnlyWhereAPageBeginsWithItsPiece()
    {
        var head = Of(10);
        var pages = Paginator.Spread([head, .. Enumerable.Repeat(Of(40) with { RepeatedHead = head }, 3)], PageHeight);

        Assert.Equal([0, 10, 50], pages[0].Select(piece => piece.Top));
        Assert.Equal([0, 10], pages[1].Select(piece => piece.Top));
    }

    private static Piece Of(double height) => new(height, (_, _) => { });
}
