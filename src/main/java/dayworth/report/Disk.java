package dayworth.report;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.DirectoryNotEmptyException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.Locale;

/** The changes that are made to files, each one announced before it is made. */
final class Disk {

  private static final boolean FOLDERS_CAN_BE_FORCED =
      !System.getProperty("os.name").toLowerCase(Locale.ROOT).startsWith("windows");

  /** Is told of each change before it is made; stops it by throwing. */
  @FunctionalInterface
  interface Watch {

    /** Lets everything pass. */
    Watch NONE = path -> {};

    void beforeChanging(Path path) throws IOException;
  }

  private final Watch watch;

  Disk(Watch watch) {
    this.watch = watch;
  }

  void createFolders(Path folder) throws IOException {
    if (!Files.isDirectory(folder)) {
      watch.beforeChanging(folder);
      Files.createDirectories(folder);
    }
  }

  /** Writes a new file, or over an old one, and waits until it is on the disk. */
  void write(Path file, byte[] content) throws IOException {
    watch.beforeChanging(file);
    try (FileChannel channel =
        FileChannel.open(
            file,
            StandardOpenOption.CREATE,
            StandardOpenOption.TRUNCATE_EXISTING,
            StandardOpenOption.WRITE)) {
      ByteBuffer left = ByteBuffer.wrap(content);
      while (left.hasRemaining()) {
        channel.write(left);
      }
      channel.force(true);
    }
  }

  /** Puts {@code from} in the place of {@code to} in one go. */
  void move(Path from, Path to) throws IOException {
    watch.beforeChanging(to);
    Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
  }

  void remove(Path file) throws IOException {
    if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
      watch.beforeChanging(file);
      Files.delete(file);
    }
  }

  /** Removes a folder unless something is in it. */
  void removeIfEmpty(Path folder) throws IOException {
    if (Files.isDirectory(folder, LinkOption.NOFOLLOW_LINKS)) {
      watch.beforeChanging(folder);
      try {
        Files.delete(folder);
      } catch (DirectoryNotEmptyException inUse) {
        // What is in it belongs to somebody else, so it stays.
      }
    }
  }

  /** Removes a folder and all that is in it, without following symbolic links. */
  void removeAll(Path folder) throws IOException {
    if (!Files.exists(folder, LinkOption.NOFOLLOW_LINKS)) {
      return;
    }
    Files.walkFileTree(
        folder,
        new SimpleFileVisitor<>() {
          @Override
          public FileVisitResult visitFile(Path file, BasicFileAttributes attributes)
              throws IOException {
            remove(file);
            return FileVisitResult.CONTINUE;
          }

          @Override
          public FileVisitResult postVisitDirectory(Path visited, IOException failure)
              throws IOException {
            remove(visited);
            return FileVisitResult.CONTINUE;
          }
        });
  }

  /** Waits until the names in a folder are on the disk, where the system can do so. */
  void force(Path folder) throws IOException {
    if (FOLDERS_CAN_BE_FORCED) {
      try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
        channel.force(true);
      }
    }
  }
}
