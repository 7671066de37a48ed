using System.Data;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using Npgsql;
using UnitVent.Charting.Windows;

namespace UnitVent.Benchmarks;

/// <summary>The rows of a board as somebody who knows the tables would read them: four prepared statements, every column fetched.</summary>
internal sealed class HandWrittenBoard : IAsyncDisposable
{
    private const string Unit = "select code, name, time_zone, altitude_m, tension_unit, method, check_interval, shift_starts, is_demo from unit where id = $1";
    private const string Beds = "select name from bed where unit_id = $1 and not retired order by position";
    private const string Flags = "select id, episode_id, rule, state, since, finding, in_hand from flag where unit_id = $1 and state = 'Open'";
    private const string Episodes = """
        select e.id, e.admitted_at, e.airway_secured_at, e.reason, p.facts, b.name
        from episode e
        join patient p on p.unit_id = e.unit_id and p.id = e.patient_id
        join bed_stay s on s.unit_id = e.unit_id and s.episode_id = e.id and s.until is null
        join bed b on b.unit_id = s.unit_id and b.id = s.bed_id
        where e.unit_id = $1 and e.ended_at is null
        """;

    private const string Entries = """
        with wanted as (select id from episode where unit_id = $1 and ended_at is null)
        select e.id, e.unit_id, e.episode_id, e.kind, e.effective_at, e.recorded_at, e.recorded_by, e.recorded_by_id, e.sequence, e.corrects,
               e.correction_reason, e.confirmed, e.body
        from wanted w
        cross join lateral (
            select * from entry s where s.unit_id = $1 and s.episode_id = w.id and s.effective_at > $2 and s.effective_at <= $3
            union all
            select * from entry s where s.unit_id = $1 and s.episode_id = w.id and s.effective_at <= $2
              and s.kind in ('Context', 'Target', 'Phase', 'Method', 'Event', 'FollowUp')
            union all
            select l.* from unnest(array['SettingChange', 'BloodGas', 'VentilatorCheck', 'BreathingCheck', 'AirwayCheck', 'Note']) k(kind)
            cross join lateral (
                select * from entry s where s.unit_id = $1 and s.episode_id = w.id and s.kind = k.kind and s.effective_at <= $2
                  and not exists (select from strike_out o where o.unit_id = s.unit_id and o.entry_id = s.id)
                  and not exists (select from entry c where c.unit_id = s.unit_id and c.corrects = s.id)
                order by s.effective_at desc, s.sequence desc limit 1) l
        ) e
        where not exists (select from strike_out o where o.unit_id = e.unit_id and o.entry_id = e.id)
          and not exists (select from entry c where c.unit_id = e.unit_id and c.corrects = e.id)
        """;

    private readonly List<(NpgsqlCommand Command, bool Counted)> commands = [];

    public static async Task<HandWrittenBoard> PrepareAsync(DemoBoard demo)
    {
        var board = new HandWrittenBoard();
        var connection = (NpgsqlConnection)demo.Db.Database.GetDbConnection();
        foreach (var (text, counted) in new[] { (Unit, false), (Beds, false), (Episodes, true), (Entries, true), (Flags, true) })
        {
            var command = new NpgsqlCommand(text, connection);
            command.Parameters.Add(new NpgsqlParameter<Guid> { TypedValue = demo.UnitId });
            if (text == Entries)
            {
                command.Parameters.Add(new NpgsqlParameter<Instant> { TypedValue = demo.Now - ChartWindow.Span });
                command.Parameters.Add(new NpgsqlParameter<Instant> { TypedValue = demo.Now });
            }

            await command.PrepareAsync();
            board.commands.Add((command, counted));
        }

        return board;
    }

    /// <summary>Reads everything.</summary>
    /// <returns>How many episodes, entries and flags there were.</returns>
    public async Task<int> ReadAsync()
    {
        var rows = 0;
        foreach (var (command, counted) in commands)
        {
            await using var reader = await command.ExecuteReaderAsync(CommandBehavior.Default);
            while (await reader.ReadAsync())
            {
                for (var i = 0; i < reader.FieldCount; i++)
                {
                    _ = reader.GetValue(i);
                }

                rows += counted ? 1 : 0;
            }
        }

        return rows;
    }

    public async ValueTask DisposeAsync()
    {
        foreach (var (command, _) in commands)
        {
            await command.DisposeAsync();
        }
    }
}
