namespace UnitVent.Web.Hosting;

/// <summary>The names of the policies that pages and endpoints demand. What a person may do in a unit is decided by the store.</summary>
public static class Policies
{
    /// <summary>May open the administration page: administrators, and charge therapists for their beds.</summary>
    public const string Administer = "administer";

    /// <summary>A bearer token of this program, for the HTTP interface.</summary>
    public const string Token = "token";
}
