package spanwright.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileTime;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.Locale;

/** The few file operations that everything rests on: forced writes and atomic renames. */
final class Disk {
  static final String TEMPORARY = ".tmp";

  private Disk() {}

  /** Makes the folder, readable by its owner alone where the system knows of owners. */
  static void makeFolder(Path folder) throws IOException {
    if (Files.isDirectory(folder)) {
      return;
    }
    if (folder.getFileSystem().supportedFileAttributeViews().contains("posix")) {
      Files.createDirectories(
          folder,
          PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------")));
    } else {
      Files.createDirectories(folder);
    }
  }

  /** Writes bytes beside the target and forces them to the disk; the target is untouched. */
  static Path writeBeside(Path target, byte[] bytes, Instant time) throws IOException {
    Path beside = target.resolveSibling(target.getFileName() + TEMPORARY);
    try (FileChannel channel =
        FileChannel.open(
            beside,
            StandardOpenOption.CREATE,
            StandardOpenOption.WRITE,
            StandardOpenOption.TRUNCATE_EXISTING)) {
      ByteBuffer buffer = ByteBuffer.wrap(bytes);
      while (buffer.hasRemaining()) {
        channel.write(buffer);
      }
      channel.force(true);
    } catch (IOException e) {
      Files.deleteIfExists(beside);
      throw e;
    }
    Files.setLastModifiedTime(beside, FileTime.from(time));
    return beside;
  }

  /** Renames in one step, over whatever is there, and forces the folder. */
  static void rename(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
    forceFolder(to.getParent());
  }

  /** Without this a crash may forget the rename. Not every system can open a folder. */
  private static void forceFolder(Path folder) {
    try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (IOException e) {
      // Windows has no such call and orders renames itself.
    }
  }

  /** Why a file operation failed, in words, without the names of classes. */
  static String reason(IOException e) {
    if (e instanceof AccessDeniedException) {
      return "no permission";
    }
    if (e instanceof NoSuchFileException) {
      return "not found";
    }
    if (e instanceof FileAlreadyExistsException || e instanceof NotDirectoryException) {
      return "a file is in the way";
    }
    if (e instanceof FileSystemException failed && failed.getReason() != null) {
      return failed.getReason().toLowerCase(Locale.ROOT);
    }
    String text = e.getMessage();
    return text == null || text.contains("java.") ? "the disk refused" : text;
  }
}
