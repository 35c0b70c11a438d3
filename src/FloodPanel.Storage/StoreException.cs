namespace FloodPanel.Storage;

/// <summary>The store cannot do what it must. The message is a sentence for the user.</summary>
public sealed class StoreException : Exception
{
    public StoreException(string message)
        : base(message)
    {
    }

    public StoreException(string message, Exception cause)
        : base(message, cause)
    {
    }
}
