package dayworth.casefile;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/**
 * A small sound case of a job that has not started, using every column and term of one, with a page
 * that explains them and the status of later: what a new case folder begins as.
 */
public final class StarterCase {

  private static final List<String> FILES =
      List.of(ActivityTable.FILE, LinkTable.FILE, TermsTable.FILE, HolidayTable.FILE, "README.txt");

  private final Path target;

  private StarterCase(Path target) {
    this.target = target;
  }

  /**
   * Writes the case, whole or not at all.
   *
   * @param folder is made if it is not there; otherwise it must be empty
   * @return the files that were written
   * @throws StarterRefused if something is in the folder, or it cannot be written
   */
  public static List<Path> write(Path folder) throws StarterRefused {
    new StarterCase(folder.toAbsolutePath().normalize()).write();
    return FILES.stream().map(folder::resolve).toList();
  }

  private void write() throws StarterRefused {
    try {
      if (!Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
        writeNewFolder();
      } else if (!Files.isDirectory(target)) {
        throw new StarterRefused(target + " is there and is no folder; name a new folder.");
      } else if (!isEmpty()) {
        throw new StarterRefused(target + " is there and is not empty; name a new folder.");
      } else {
        writeIntoFolder();
      }
    } catch (IOException failure) {
      throw StarterRefused.because(target, failure);
    }
  }

  private boolean isEmpty() throws IOException {
    try (Stream<Path> entries = Files.list(target)) {
      return entries.findAny().isEmpty();
    }
  }

  private void writeNewFolder() throws IOException {
    Path parent = target.getParent();
    Files.createDirectories(parent);
    Path temporary = Files.createTempDirectory(parent, ".dayworth-begin-");
    Path fresh = temporary.resolve("case");
    try {
      writeFiles(fresh);
      Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE);
    } finally {
      remove(fresh);
      Files.delete(temporary);
    }
  }

  /** An empty folder is kept and filled: somebody may be standing in it. */
  private void writeIntoFolder() throws IOException {
    Path temporary = Files.createTempDirectory(target, ".dayworth-begin-");
    Path fresh = temporary.resolve("case");
    List<Path> moved = new ArrayList<>();
    try {
      writeFiles(fresh);
      for (String name : FILES) {
        Files.move(fresh.resolve(name), target.resolve(name));
        moved.add(target.resolve(name));
      }
    } catch (IOException failure) {
      for (Path file : moved) {
        Files.deleteIfExists(file);
      }
      throw failure;
    } finally {
      remove(fresh);
      Files.delete(temporary);
    }
  }

  private static void writeFiles(Path fresh) throws IOException {
    Files.createDirectory(fresh);
    for (String name : FILES) {
      try (InputStream content = StarterCase.class.getResourceAsStream("starter/" + name)) {
        if (content == null) {
          throw new IllegalStateException("the program lacks its own starter/" + name);
        }
        Files.copy(content, fresh.resolve(name));
      }
    }
  }

  private static void remove(Path fresh) throws IOException {
    for (String name : FILES) {
      Files.deleteIfExists(fresh.resolve(name));
    }
    Files.deleteIfExists(fresh);
  }
}
