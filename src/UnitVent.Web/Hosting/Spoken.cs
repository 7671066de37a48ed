using UnitVent.Charting.Results;
using UnitVent.Store.Cluster;

namespace UnitVent.Web.Hosting;

/// <summary>What the command line says: answers on standard output, everything else on standard error.</summary>
public static class Spoken
{
    public const int Failed = 1;

    /// <summary>Runs a verb; what cannot work here is said in a sentence, not as a stack of calls.</summary>
    public static async Task<int> RunAsync(Func<Task<int>> verb)
    {
        try
        {
            return await verb();
        }
        catch (Exception e) when (e is LocalClusterException or IOException or System.Data.Common.DbException or InvalidDataException)
        {
            await Console.Error.WriteLineAsync("unitvent: " + e.Message);
            return Failed;
        }
    }

    /// <summary>Says an answer, or every reason why there is none.</summary>
    public static async Task<int> AnswerAsync<T>(Result<T> result, Func<T, string> words)
    {
        if (result.Succeeded)
        {
            await Console.Out.WriteLineAsync(words(result.Value));
            return 0;
        }

        foreach (var error in result.Errors)
        {
            await Console.Error.WriteLineAsync($"unitvent: {error.Message}");
        }

        return Failed;
    }
}
