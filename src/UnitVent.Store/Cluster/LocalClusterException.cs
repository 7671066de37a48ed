namespace UnitVent.Store.Cluster;

/// <summary>A private PostgreSQL cluster cannot be run; the message tells whoever runs the program what to do.</summary>
public sealed class LocalClusterException : Exception
{
    internal LocalClusterException(string message, Exception? inner = null)
        : base(message, inner)
    {
    }
}
