using System.CommandLine;
using UnitVent.Store.People;
using UnitVent.Store.Units;

namespace UnitVent.Web.Hosting;

/// <summary>The verbs that keep units, people and tokens from the command line.</summary>
public static class Verbs
{
    public static IEnumerable<Command> All() => [Migrate(), LoadDemo(), CreateUnit(), CreateUser(), ResetPassword(), CreateToken()];

    private static Command Migrate() => Verb("migrate", "Bring the database to the shape that this version needs.", [], (_, _, _) => Task.FromResult(0));

    private static Command LoadDemo() => Verb("load-demo", "Fill the invented unit DEMO, topped up to now.", [], async (session, _, cancel) =>
    {
        await Console.Out.WriteLineAsync(await DemoUnitLoad.RunAsync(session.Database, cancel));
        return 0;
    });

    private static Command CreateUnit()
    {
        var code = Needed("--code", "The short code: capitals, digits, hyphens.");
        var name = Needed("--name", "The name on screens and sheets.");
        var zone = Needed("--time-zone", "The IANA name of the time zone, for example Europe/Zurich.");
        var beds = new Option<string[]>("--beds") { Description = "The beds in walking order.", Required = true, AllowMultipleArgumentsPerToken = true };
        var altitude = new Option<double>("--altitude") { Description = "Metres above the sea." };
        return Verb("create-unit", "Make a unit with its beds.", [code, name, zone, beds, altitude], async (session, parse, cancel) =>
        {
            var unit = new NewUnit(parse.GetValue(code)!, parse.GetValue(name)!, parse.GetValue(zone)!, parse.GetValue(beds)!)
            {
                Settings = new UnitSettings { AltitudeM = parse.GetValue(altitude) },
            };
            return await Spoken.AnswerAsync(await session.Desk<UnitDesk>().CreateAsync(UserDesk.CommandLine, unit, cancel), _ => unit.Code);
        });
    }

    private static Command CreateUser()
    {
        var user = Needed("--user", "The name to sign in with.");
        var name = Needed("--name", "The name on screens and entries.");
        var unit = new Option<string?>("--unit") { Description = "The unit that the person belongs to." };
        var role = new Option<UnitRole>("--role") { Description = "What the person is in it." };
        var administrator = new Option<bool>("--administrator") { Description = "Whether the person administers units, users and tokens." };
        return Verb("create-user", "Make a person; prints a one-time code to sign in with.", [user, name, unit, role, administrator], async (session, parse, cancel) =>
        {
            var users = session.Desk<UserDesk>();
            var made = await users.CreateAsync(UserDesk.CommandLine, parse.GetValue(user)!, parse.GetValue(name)!, null, parse.GetValue(administrator), cancel);
            if (made.Succeeded && parse.GetValue(unit) is { } code
                && await users.SetMembershipAsync(UserDesk.CommandLine, made.Value.Id, code, parse.GetValue(role), cancel) is { Succeeded: false } refused)
            {
                return await Spoken.AnswerAsync(refused, _ => "");
            }

            return await Spoken.AnswerAsync(made, m => m.Secret);
        });
    }

    private static Command ResetPassword()
    {
        var user = Needed("--user", "The name to sign in with.");
        return Verb("reset-password", "Give a person a one-time code to sign in with; prints it.", [user], async (session, parse, cancel) =>
            await Spoken.AnswerAsync(await session.Desk<UserDesk>().ResetPasswordAsync(UserDesk.CommandLine, parse.GetValue(user)!, cancel), p => p.Secret));
    }

    private static Command CreateToken()
    {
        var unit = Needed("--unit", "The unit's code.");
        var role = new Option<UnitRole>("--role") { Description = "What the token is in the unit.", Required = true };
        var name = Needed("--name", "What it is for; entries carry it.");
        return Verb("create-token", "Make a token of the HTTP interface, good for a year; prints it alone.", [unit, role, name], async (session, parse, cancel) =>
            await Spoken.AnswerAsync(
                await session.Desk<TokenDesk>().CreateAsync(UserDesk.CommandLine, parse.GetValue(unit)!, parse.GetValue(role), parse.GetValue(name)!, null, cancel),
                token => token));
    }

    private static Option<string> Needed(string name, string description) => new(name) { Description = description, Required = true };

    private static Command Verb(string name, string description, IReadOnlyList<Option> options, Func<StoreSession, ParseResult, CancellationToken, Task<int>> work)
    {
        var command = new Command(name, description);
        foreach (var option in options)
        {
            command.Add(option);
        }

        command.SetAction((parse, cancel) => Spoken.RunAsync(async () =>
        {
            await using var session = await StoreSession.OpenAsync(cancel);
            return await work(session, parse, cancel);
        }));
        return command;
    }
}
