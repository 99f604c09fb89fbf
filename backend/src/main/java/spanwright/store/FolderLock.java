package spanwright.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/** Keeps a second program out of a data folder; given up by the system when the program ends. */
final class FolderLock implements AutoCloseable {
  private static final String NAME = ".in-use";

  private final FileChannel channel;

  private FolderLock(FileChannel channel) {
    this.channel = channel;
  }

  /** Takes the lock or says who is in the way. */
  static FolderLock take(Path folder) {
    FileChannel channel = null;
    try {
      channel =
          FileChannel.open(
              folder.resolve(NAME), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      FileLock lock = channel.tryLock();
      if (lock != null) {
        return new FolderLock(channel);
      }
    } catch (OverlappingFileLockException e) {
      // Held within this very program: the same answer as from another one.
    } catch (IOException e) {
      closeQuietly(channel);
      throw new StoreTrouble(
          "The data folder "
              + folder
              + " cannot be locked ("
              + Disk.reason(e)
              + "). Choose a folder on a local disk that you may write to, with --data.",
          e);
    }
    closeQuietly(channel);
    throw new StoreTrouble(
        "The data folder "
            + folder
            + " is in use by another running Spanwright. Use that one, stop it, or choose another"
            + " folder with --data.");
  }

  private static void closeQuietly(FileChannel channel) {
    try {
      if (channel != null) {
        channel.close();
      }
    } catch (IOException e) {
      // It was never ours to lose.
    }
  }

  @Override
  public void close() {
    closeQuietly(channel);
  }
}
