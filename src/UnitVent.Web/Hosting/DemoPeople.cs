using System.Security.Cryptography;
using System.Text;
using Microsoft.AspNetCore.Identity;
using UnitVent.Store.People;
using UserAccount = UnitVent.Store.People.Account;

namespace UnitVent.Web.Hosting;

/// <summary>The people of the invented unit: one a role, with one password that belongs to this installation alone and is printed at every start.</summary>
public sealed class DemoPeople(IServiceProvider desks, Database database, CancellationToken cancel)
{
    public const string UnitCode = "DEMO";

    private const int PasswordLength = 20;

    private static readonly (string UserName, string Name, UnitRole Role, bool Administers)[] People =
    [
        ("demo.viewer", "Vera Viewer (demo)", UnitRole.Viewer, false),
        ("demo.nurse", "Nils Nurse (demo)", UnitRole.Nurse, false),
        ("demo.therapist", "Thea Therapist (demo)", UnitRole.Therapist, false),
        ("demo.charge", "Chris Charge (demo)", UnitRole.ChargeTherapist, false),
        ("demo.physician", "Phil Physician (demo)", UnitRole.Physician, false),
        ("demo.admin", "Ada Administrator (demo)", UnitRole.Viewer, true),
    ];

    /// <summary>Makes whoever is missing.</summary>
    /// <returns>How to sign in.</returns>
    public async Task<string> EnsureAsync()
    {
        var (users, password) = (desks.GetRequiredService<UserDesk>(), Password());
        var known = await users.ListAsync(UserDesk.CommandLine, cancel);
        foreach (var (userName, name, role, administers) in People)
        {
            if (known.Succeeded && known.Value.All(p => p.UserName != userName)
                && await users.CreateAsync(UserDesk.CommandLine, userName, name, password, administers, cancel) is { Succeeded: true, Value.Id: var id })
            {
                await users.SetMembershipAsync(UserDesk.CommandLine, id, UnitCode, role, cancel);
            }
        }

        var changed = await ChangedAsync(password);
        return $"Demonstration sign-ins: {string.Join(", ", People.Select(p => p.UserName))}\n"
            + (changed.Count == 0 ? $"Password of all: {password}" : $"Password of all but {string.Join(", ", changed)}: {password}");
    }

    /// <summary>Whoever no longer has the password that was given to all.</summary>
    private async Task<List<string>> ChangedAsync(string password)
    {
        await using var scope = desks.CreateAsyncScope();
        var manager = scope.ServiceProvider.GetRequiredService<UserManager<UserAccount>>();
        var changed = new List<string>();
        foreach (var (userName, _, _, _) in People)
        {
            if (await manager.FindByNameAsync(userName) is { } account && !await manager.CheckPasswordAsync(account, password))
            {
                changed.Add(userName);
            }
        }

        return changed;
    }

    private string Password()
    {
        var hash = HMACSHA256.HashData(Encoding.UTF8.GetBytes(database.InstallationSecret), "demonstration sign-ins"u8);
        return Convert.ToHexStringLower(hash)[..PasswordLength];
    }
}
