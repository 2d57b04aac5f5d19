using System.Collections.Concurrent;
using System.Globalization;
using LiteDB;
using LiteDB.Engine;
using Microsoft.Win32.SafeHandles;

namespace ProcessPlan.Store;

/// <summary>
/// The guard around the book's file, and the one place that opens a database. Reading never touches the file: its bytes are taken under the lock and
/// opened in memory. A change is made to such a copy first and what came out is read whole; only then it is made to the file, in one
/// transaction whose log is on the disk before the call returns.
/// </summary>
/// <remarks>
/// Unguarded the library overwrites foreign files, lets two programs write at once, leaves commits in the system's cache and trims strings.
/// Rebuild, passwords and shared mode are not used: each loses data in some case.
/// </remarks>
internal sealed class BookFile
{
    private const int PageBytes = 8192;
    private const int SignatureAt = 32;
    private const int VersionAt = 59;
    private const byte FileVersion = 8;
    private const int HeadBytes = VersionAt + 1;
    private const int Invariant = 127;

    /// <summary>Any longer, and the user would rather be told.</summary>
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(3);

    /// <summary>
    /// Databases that failed are closed, but kept: what the library could not let go of it tries again when it is collected, and an exception there ends the process.
    /// </summary>
    private static readonly ConcurrentBag<LiteDatabase> Failed = [];

    private readonly TimeSpan _patience;

    /// <param name="path">The book's file; a link is followed, so that a book has one lock under all its names.</param>
    /// <param name="patience">How long to wait for another program; a few seconds where nothing is said.</param>
    /// <exception cref="ShopBookException">No book can have this name.</exception>
    public BookFile(string path, TimeSpan? patience = null)
    {
        FileInfo file = new(System.IO.Path.GetFullPath(path));
        Path = (file.Exists ? file.ResolveLinkTarget(returnFinalTarget: true)?.FullName : null) ?? file.FullName;
        _patience = patience ?? Patience;
        string name = System.IO.Path.GetFileNameWithoutExtension(Path);
        if (name.EndsWith("-log", StringComparison.OrdinalIgnoreCase) || name.EndsWith("-tmp", StringComparison.OrdinalIgnoreCase))
        {
            throw new ShopBookException($"{Path} is no name for a shop book: -log and -tmp mark the files that belong to one.");
        }
    }

    public string Path { get; }

    private string Log => Beside("-log");

    private static ReadOnlySpan<byte> Signature => "** This is a LiteDB file **"u8;

    /// <summary>Reads the book as it stands.</summary>
    public T Read<T>(Func<LiteDatabase, T> read)
    {
        RefuseUnusable();
        (MemoryStream data, MemoryStream log) = Guarded(() =>
        {
            using FileStream held = BookLock.Take(Path, _patience);
            return Copy();
        });
        return OpenCopy(data, log, read);
    }

    /// <summary>Changes the book. What <paramref name="change"/> throws leaves the file as it was.</summary>
    /// <param name="change">Called twice, with a copy in memory and with the file; must do the same both times.</param>
    /// <param name="read">Reads the changed copy, before the file is touched.</param>
    /// <param name="before">Called before the file is touched, under the lock.</param>
    public T Change<T>(Action<LiteDatabase> change, Func<LiteDatabase, T> read, Action<LiteDatabase>? before = null)
    {
        RefuseUnusable();
        RefuseReadOnly();
        return Guarded(() =>
        {
            using FileStream held = BookLock.Take(Path, _patience);
            (MemoryStream data, MemoryStream log) = Copy();
            T result = OpenCopy(data, log, copy =>
            {
                before?.Invoke(copy);
                change(copy);
                return read(copy);
            });
            Commit(change);
            return result;
        });
    }

    /// <summary>Creates the book with its first content, which is read back before the file takes its name.</summary>
    public T Create<T>(Action<LiteDatabase> fill, Func<LiteDatabase, T> read)
    {
        string folder = System.IO.Path.GetDirectoryName(Path)!;
        if (!Directory.Exists(folder))
        {
            throw new ShopBookException($"There is no folder {folder} for a shop book.");
        }

        return Guarded(() =>
        {
            using FileStream held = BookLock.Take(Path, _patience);
            RefuseTaken();
            MemoryStream data = new();
            using (LiteDatabase book = OpenNew(data))
            {
                fill(book);
            }

            return WriteWhole(data, Path, overwrite: false, written => OpenCopy(written, new MemoryStream(), read));
        });
    }

    /// <summary>Copies the book, with what its log still holds, to another file; the copy is read before it takes its name.</summary>
    public void Backup(string target, Action<LiteDatabase> check)
    {
        RefuseUnusable();
        BookFile copy = new(target);
        if (copy.Path == Path)
        {
            throw new ShopBookException($"{Path} cannot be its own backup.");
        }

        copy.RefuseForeign();
        Guarded(() =>
        {
            using FileStream held = BookLock.Take(Path, _patience);
            WriteBackup(copy, check);
            return true;
        });
    }

    /// <summary>The same while the lock is held already.</summary>
    public void WriteBackup(BookFile target, Action<LiteDatabase> check)
    {
        if (!Directory.Exists(System.IO.Path.GetDirectoryName(target.Path)))
        {
            throw new ShopBookException($"There is no folder {System.IO.Path.GetDirectoryName(target.Path)} for a backup.");
        }

        (MemoryStream data, MemoryStream log) = Copy();

        // Closing the copy takes the log into the data, which then is the whole book in one file.
        OpenCopy(data, log, _ => true);
        WriteWhole(data, target.Path, overwrite: true, written => OpenCopy(written, new MemoryStream(), copy =>
        {
            check(copy);
            return true;
        }));
    }

    /// <summary>A file of the same folder and ending, whose name says what it is.</summary>
    public string Beside(string suffix) => System.IO.Path.Combine(
        System.IO.Path.GetDirectoryName(Path)!, System.IO.Path.GetFileNameWithoutExtension(Path) + suffix + System.IO.Path.GetExtension(Path));

    /// <summary>Writes a file beside its place, reads it back, and only then gives it its name.</summary>
    private static T WriteWhole<T>(MemoryStream data, string path, bool overwrite, Func<MemoryStream, T> check)
    {
        string part = path + ".part";
        try
        {
            using (FileStream file = File.Create(part))
            {
                data.WriteTo(file);
                file.Flush(flushToDisk: true);
            }

            T result = check(Bytes(part));
            File.Move(part, path, overwrite);
            return result;
        }
        catch (IOException failure) when (failure is not ShopBookException)
        {
            throw new ShopBookException($"{path} cannot be written: {failure.Message}", failure);
        }
        finally
        {
            File.Delete(part);
        }
    }

    /// <summary>The library ties a transaction to its thread: nothing is awaited here. After any failure the database is closed, never used again.</summary>
    private void Commit(Action<LiteDatabase> change)
    {
        try
        {
            Use(Open(Path), book =>
            {
                if (!book.BeginTrans())
                {
                    throw new InvalidOperationException("A transaction was begun inside another one.");
                }

                change(book);
                if (!book.Commit())
                {
                    throw new InvalidOperationException("The library knows nothing of the transaction.");
                }

                // The library leaves a commit in the system's cache, where a power cut would take it.
                if (File.Exists(Log))
                {
                    using SafeFileHandle log = File.OpenHandle(Log, FileMode.Open, FileAccess.ReadWrite, FileShare.ReadWrite);
                    RandomAccess.FlushToDisk(log);
                }

                return true;
            });
        }
        catch (Exception failure) when (failure is not (ShopBookException or OutOfMemoryException))
        {
            throw new ShopBookException($"{Path} cannot be written ({failure.Message}); what was acknowledged before stands in it.", failure);
        }
    }

#pragma warning disable RS0030 // This is the guard that the ban points to.
    private static LiteDatabase Open(string path) => new(new ConnectionString { Filename = path, Connection = ConnectionType.Direct }, Exact());

    /// <summary>What is set here stays in the file: names are compared letter by letter on every machine, and instants are UTC.</summary>
    private static LiteDatabase OpenNew(MemoryStream data) =>
        new(new LiteEngine(new EngineSettings { DataStream = data, Collation = new Collation(Invariant, CompareOptions.Ordinal) }), Exact()) { UtcDate = true };

    private static LiteDatabase Open(MemoryStream data, MemoryStream log) => new(data, Exact(), log);
#pragma warning restore RS0030

    private static BsonMapper Exact() => new() { TrimWhitespace = false, EmptyStringToNull = false };

    private T OpenCopy<T>(MemoryStream data, MemoryStream log, Func<LiteDatabase, T> use)
    {
        try
        {
            return Use(Open(data, log), use);
        }
        catch (Exception damage) when (damage is not (ShopBookException or UnauthorizedAccessException or OutOfMemoryException))
        {
            // The library throws whatever it stumbles over in a damaged file. This was a copy.
            throw new DamagedBookException($"{Path} is damaged and cannot be read ({damage.Message}); it was left as it is. Use a backup.", damage);
        }
    }

    private static T Use<T>(LiteDatabase database, Func<LiteDatabase, T> use)
    {
        bool isSound = false;
        try
        {
            T result = use(database);
            isSound = true;
            return result;
        }
        catch (ShopBookException refusal) when (refusal is not DamagedBookException)
        {
            isSound = true;
            throw;
        }
        finally
        {
            database.Dispose();
            if (!isSound)
            {
                Failed.Add(database);
            }
        }
    }

    private (MemoryStream Data, MemoryStream Log) Copy()
    {
        MemoryStream data = Bytes(Path);
        MemoryStream log = File.Exists(Log) ? Bytes(Log) : new MemoryStream();

        // A process that was killed while it wrote its log into the data may leave part of a page; the log then has all of it.
        return data.Length >= PageBytes && (data.Length % PageBytes == 0 || log.Length > 0)
            ? (data, log)
            : throw new ShopBookException($"{Path} is cut short; it was left as it is. Use a backup.");
    }

    private static MemoryStream Bytes(string path)
    {
        using FileStream file = new(path, FileMode.Open, FileAccess.Read, FileShare.ReadWrite);
        MemoryStream bytes = new((int)Math.Min(file.Length, Array.MaxLength));
        file.CopyTo(bytes);
        bytes.Position = 0;
        return bytes;
    }

    /// <summary>Whatever is no shop book is refused by what it looks like, before a lock is taken beside it.</summary>
    private void RefuseUnusable()
    {
        FileInfo file = new(Path);
        if (Directory.Exists(Path))
        {
            throw new ShopBookException($"{Path} is a folder, not a shop book.");
        }

        if (!file.Exists)
        {
            throw new ShopBookException($"There is no shop book {Path}.");
        }

        if (file.Length == 0)
        {
            throw new ShopBookException($"{Path} is empty, not a shop book; it was left as it is.");
        }

        Guarded(() =>
        {
            using FileStream head = new(Path, FileMode.Open, FileAccess.Read, FileShare.ReadWrite);
            Span<byte> bytes = stackalloc byte[HeadBytes];
            int read = head.ReadAtLeast(bytes, HeadBytes, throwOnEndOfStream: false);
            return read == HeadBytes && bytes[SignatureAt..].StartsWith(Signature) && bytes[VersionAt] == FileVersion
                ? true
                : throw new ShopBookException($"{Path} is not a shop book; it was left as it is.");
        });
    }

    private void RefuseReadOnly()
    {
        if (new FileInfo(Path).IsReadOnly)
        {
            throw new ShopBookException($"{Path} is read-only; nothing was written.");
        }
    }

    private void RefuseTaken()
    {
        if (System.IO.Path.Exists(Path))
        {
            throw new ShopBookException($"There is already a file {Path}; it was left as it is.");
        }

        if (File.Exists(Log))
        {
            throw new ShopBookException($"{Log} belongs to a shop book that is missing; move it away before another one takes its name.");
        }
    }

    /// <summary>A backup may take the place of an older backup, and of nothing else.</summary>
    private void RefuseForeign()
    {
        if (System.IO.Path.Exists(Path))
        {
            RefuseUnusable();
        }
    }

    /// <summary>Says which book it was that the system would not let be read or written.</summary>
    private T Guarded<T>(Func<T> use)
    {
        try
        {
            return use();
        }
        catch (UnauthorizedAccessException denied)
        {
            throw new ShopBookException($"{Path} cannot be used without more rights: {denied.Message}", denied);
        }
        catch (Exception failure) when (failure is LiteException or (IOException and not ShopBookException))
        {
            throw new ShopBookException($"{Path} cannot be used: {failure.Message}", failure);
        }
    }
}
