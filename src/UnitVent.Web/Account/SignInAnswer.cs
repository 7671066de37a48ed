namespace UnitVent.Web.Account;

/// <summary>What came of an attempt to sign in.</summary>
public enum SignInAnswer
{
    SignedIn,
    DoesNotFit,
    StoreIsAway,
}
