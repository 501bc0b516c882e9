package dayworth.report;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import java.util.Optional;
import java.util.UUID;

/**
 * Lets one run at a time write to a folder.
 *
 * <p>The lock is on a file that its holder takes away again. A run that opened the file just before
 * that would hold a lock on a file which nobody else can see; so the holder writes a mark and looks
 * whether the file of that name carries it.
 */
final class FolderLock implements Closeable {

  private final Path file;
  private final FileChannel channel;

  private FolderLock(Path file, FileChannel channel) {
    this.file = file;
    this.channel = channel;
  }

  /** The lock, or nothing if another run holds it. */
  static Optional<FolderLock> on(Path file) throws IOException {
    FileChannel channel =
        FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    boolean held = false;
    try {
      held = channel.tryLock() != null && isSeen(file, channel);
    } catch (OverlappingFileLockException sameProcess) {
      held = false;
    } finally {
      if (!held) {
        channel.close();
      }
    }
    return held ? Optional.of(new FolderLock(file, channel)) : Optional.empty();
  }

  private static boolean isSeen(Path file, FileChannel channel) throws IOException {
    byte[] mark = UUID.randomUUID().toString().getBytes(StandardCharsets.US_ASCII);
    channel.truncate(0);
    channel.write(ByteBuffer.wrap(mark));
    try {
      return Arrays.equals(mark, Files.readAllBytes(file));
    } catch (NoSuchFileException taken) {
      return false;
    }
  }

  @Override
  public void close() throws IOException {
    try (channel) {
      Files.deleteIfExists(file);
    }
  }
}
