namespace UnitVent.Store.People;

/// <summary>What is handed over to a person: shown once.</summary>
/// <param name="Id">The person.</param>
/// <param name="Secret">The password or one-time code.</param>
public sealed record NewPerson(Guid Id, string Secret);
