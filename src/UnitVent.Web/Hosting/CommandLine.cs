using System.CommandLine;

namespace UnitVent.Web.Hosting;

/// <summary>The verbs of the program. Without a verb it serves.</summary>
public static class CommandLine
{
    private static readonly Option<bool> Demo = new("--demo") { Description = "Fill the invented unit DEMO, topped up to now." };
    private static readonly Option<bool> Empty = new("--empty") { Description = "Print a one-time secret for the set-up page, while nobody can sign in." };

    public static RootCommand Create()
    {
        var serve = new Command("serve", "Serve the screens and the HTTP interface (the default).") { Demo, Empty };
        var root = new RootCommand("UnitVent: follow every ventilated patient of a unit.") { Demo, Empty, serve };
        foreach (var command in new[] { root, serve })
        {
            command.TreatUnmatchedTokensAsErrors = false;
            command.SetAction((parse, cancel) => Spoken.RunAsync(
                () => Serve.RunAsync(new(parse.GetValue(Demo), parse.GetValue(Empty), [.. parse.UnmatchedTokens]), cancel)));
        }

        foreach (var verb in Verbs.All())
        {
            root.Add(verb);
        }

        return root;
    }
}
