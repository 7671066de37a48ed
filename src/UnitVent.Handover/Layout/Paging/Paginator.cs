namespace UnitVent.Handover.Layout.Paging;

/// <summary>Spreads pieces over pages: what is kept together moves together, and a table's head is repeated.</summary>
internal sealed class Paginator(double pageHeight)
{
    private readonly List<List<PlacedPiece>> pages = [[]];
    private double used;

    public static IReadOnlyList<IReadOnlyList<PlacedPiece>> Spread(IEnumerable<Piece> pieces, double pageHeight)
    {
        var paginator = new Paginator(pageHeight);
        foreach (var chain in Chains(pieces))
        {
            paginator.Place(chain);
        }

        return paginator.pages;
    }

    private static IEnumerable<List<Piece>> Chains(IEnumerable<Piece> pieces)
    {
        List<Piece> chain = [];
        foreach (var piece in pieces)
        {
            chain.Add(piece);
            if (!piece.KeepWithNext)
            {
                yield return chain;
                chain = [];
            }
        }

        if (chain.Count > 0)
        {
            yield return chain;
        }
    }

    private void Place(List<Piece> chain)
    {
        if (used > 0 && used + HeightOf(chain) > pageHeight)
        {
            if (chain[0].IsDispensable)
            {
                return;
            }

            NextPage();
        }

        foreach (var piece in chain)
        {
            if (used > 0 && used + piece.Height > pageHeight)
            {
                NextPage();
            }

            if (used == 0 && piece.RepeatedHead is { } head)
            {
                Add(head);
            }

            Add(piece);
        }
    }

    private static double HeightOf(List<Piece> chain)
    {
        var last = chain.FindLastIndex(piece => !piece.IsSpace);
        return chain.Take(last + 1).Sum(piece => piece.Height);
    }

    private void Add(Piece piece)
    {
        if (used == 0 && piece.IsSpace)
        {
            return;
        }

        pages[^1].Add(new PlacedPiece(piece, used));
        used += piece.Height;
    }

    private void NextPage()
    {
        pages.Add([]);
        used = 0;
    }
}
