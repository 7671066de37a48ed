namespace UnitVent.Store;

/// <summary>The answer to a commit was lost: whether it took is not known.</summary>
internal sealed class CommitLostException(Exception inner) : Exception("The answer to a commit was lost.", inner);
