using Npgsql;

namespace UnitVent.Store.Tests;

/// <summary>Statements behind the program's back.</summary>
internal static class Sql
{
    public static async Task<T?> AskAsync<T>(string connectionString, string statement, Guid? unit = null)
    {
        await using var connection = new NpgsqlConnection(connectionString);
        await connection.OpenAsync(TestContext.Current.CancellationToken);
        await using var transaction = await connection.BeginTransactionAsync(TestContext.Current.CancellationToken);
        if (unit is { } id)
        {
            await using var scope = new NpgsqlCommand($"select set_config('unitvent.unit', '{id}', true)", connection);
            await scope.ExecuteNonQueryAsync(TestContext.Current.CancellationToken);
        }

        await using var command = new NpgsqlCommand(statement, connection);
        var answer = await command.ExecuteScalarAsync(TestContext.Current.CancellationToken);
        await transaction.CommitAsync(TestContext.Current.CancellationToken);
        return answer is null or DBNull ? default : (T)answer;
    }

    public static Task TellAsync(string connectionString, string statement, Guid? unit = null) => AskAsync<object>(connectionString, statement, unit);
}
