namespace ProcessPlan.Store;

/// <summary>The shop book cannot be opened, read or written as asked; the message is one sentence for the person at the machine.</summary>
public class ShopBookException(string sentence, Exception? cause = null) : IOException(sentence, cause);

/// <summary>Another program changed the book after it was read; nothing was written.</summary>
/// <param name="path">The book.</param>
/// <param name="read">The revision that the change was made from.</param>
/// <param name="now">The revision that the book has.</param>
public sealed class BookChangedException(string path, long read, long now)
    : ShopBookException($"{path} was changed by another program since it was read (revision {read}, now {now}); nothing was written, read it again.")
{
    public long Read { get; } = read;

    public long Now { get; } = now;
}

/// <summary>What stands in the file is not what was written there.</summary>
internal sealed class DamagedBookException(string sentence, Exception? cause = null) : ShopBookException(sentence, cause);
