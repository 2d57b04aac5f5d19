namespace ProcessPlan.Store;

/// <summary>
/// The right to use a book, for as long as it is not disposed: an exclusive lock on a file of its own beside the book. The book's own file cannot
/// serve, because on Linux the library takes a lock there that two writers can hold. The system lets go of the lock when the process dies.
/// The empty lock file stays: two programs could each hold a lock of the same name if one deleted what the other has open.
/// </summary>
internal static class BookLock
{
    private const int LinuxWouldBlock = 11;
    private const int MacWouldBlock = 35;
    private const int WindowsSharingViolation = unchecked((int)0x80070020);
    private const int WindowsLockViolation = unchecked((int)0x80070021);

    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(10);

    /// <exception cref="ShopBookException">Another program held the lock all the time.</exception>
    public static FileStream Take(string path, TimeSpan wait)
    {
        long until = Environment.TickCount64 + (long)wait.TotalMilliseconds;
        while (true)
        {
            try
            {
                return new FileStream(path + ".lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
            }
            catch (IOException held) when (IsHeld(held))
            {
                if (Environment.TickCount64 >= until)
                {
                    throw new ShopBookException($"{path} is in use by another program; try again in a moment.", held);
                }

                Thread.Sleep(Pause);
            }
        }
    }

    private static bool IsHeld(IOException failure) =>
        failure.HResult is LinuxWouldBlock or MacWouldBlock or WindowsSharingViolation or WindowsLockViolation;
}
