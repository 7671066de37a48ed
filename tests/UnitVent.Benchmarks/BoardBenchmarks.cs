using BenchmarkDotNet.Attributes;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging.Abstractions;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Windows;
using UnitVent.Store.Reading;
using UnitVent.Web.Board;

namespace UnitVent.Benchmarks;

/// <summary>The board of the demonstration unit: its rows by hand-written prepared SQL (the baseline), by the store, with pictures, as HTML.</summary>
[MemoryDiagnoser]
[Config(typeof(InThisProcess))]
public class BoardBenchmarks
{
    private DemoBoard? demo;
    private HandWrittenBoard? handWritten;
    private ServiceProvider? services;

    /// <summary>Fills the database and checks that both sides read the same rows.</summary>
    [GlobalSetup]
    public async Task SetUpAsync()
    {
        demo = await DemoBoard.CreateAsync();
        handWritten = await HandWrittenBoard.PrepareAsync(demo);
        services = new ServiceCollection().BuildServiceProvider();
        var (byHand, byStore) = (await HandWrittenAsync(), await StoreAsync());
        if (byHand != byStore || byHand < 100)
        {
            throw new InvalidOperationException($"The two sides read different rows: {byHand} and {byStore}.");
        }
    }

    /// <summary>Drops the database.</summary>
    [GlobalCleanup]
    public async Task CleanUpAsync()
    {
        await handWritten!.DisposeAsync();
        await demo!.DisposeAsync();
        await services!.DisposeAsync();
    }

    /// <summary>The rows of the whole board by hand-written prepared SQL.</summary>
    [Benchmark(Baseline = true)]
    public Task<int> HandWrittenAsync() => handWritten!.ReadAsync();

    /// <summary>The same rows as the store reads them.</summary>
    [Benchmark]
    public async Task<int> StoreAsync()
    {
        var (db, unit) = (demo!.Db, demo.UnitId);
        await WindowLoader.ProfileAsync(db, unit, demo.Now, CancellationToken.None);
        var episodes = await WindowLoader.EpisodesAsync(db, unit, e => e.EndedAt == null, CancellationToken.None);
        var entries = await WindowLoader.EntriesAsync(db, unit, [.. episodes.Select(e => e.Id)], demo.Now - ChartWindow.Span, demo.Now, CancellationToken.None);
        var flags = await db.Flags.AsNoTracking().Where(f => f.UnitId == unit && f.State == FlagState.Open).ToListAsync();
        return episodes.Count + entries.Count + flags.Count;
    }

    /// <summary>Rows, pictures, rules and bands: the board as every viewer of the node shares it.</summary>
    [Benchmark]
    public async Task<int> BoardAsync() => (await UnitBoards.BuildAsync(demo!.Db, demo.UnitId, demo.Now, CancellationToken.None)).Value.Rows.Count;

    /// <summary>The same, rendered to HTML.</summary>
    [Benchmark]
    public async Task<int> BoardAsHtmlAsync()
    {
        var board = (await UnitBoards.BuildAsync(demo!.Db, demo.UnitId, demo.Now, CancellationToken.None)).Value;
        await using var renderer = new HtmlRenderer(services!, NullLoggerFactory.Instance);
        return await renderer.Dispatcher.InvokeAsync(async () =>
        {
            var parameters = ParameterView.FromDictionary(new Dictionary<string, object?>
            {
                [nameof(BoardTable.View)] = new BoardView([.. board.Rows.Select(r => new PatientRow(r.Picture, r.Standing, demo.Now))], BoardFilter.All[0], false, board.Unit.Beds),
                [nameof(BoardTable.TensionUnit)] = board.Unit.TensionUnit,
                [nameof(BoardTable.Details)] = (RenderFragment<PatientRow>)(_ => _ => { }),
            });
            return (await renderer.RenderComponentAsync<BoardTable>(parameters)).ToHtmlString().Length;
        });
    }
}
