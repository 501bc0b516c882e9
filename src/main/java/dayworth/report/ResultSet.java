package dayworth.report;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The files of one command in a folder, replaced as one set: whole or not at all.
 *
 * <p>New files are first written beside their places, in a hidden folder, and forced to the disk. A
 * journal that names them is put there by one atomic rename: before it the old set stands, after it
 * the new one does, for each run begins by finishing what a journal tells. Then each file takes its
 * place by an atomic rename, files of the last set that this one does not have go, and the journal
 * goes last. The end of the program waits for that part.
 */
public final class ResultSet {

  private static final String STAGING = ".dayworth-new";
  private static final String JOURNAL = ".dayworth-journal";
  private static final String LOCK = ".dayworth-lock";

  private final Path folder;
  private final Disk disk;

  private ResultSet(Path folder, Disk disk) {
    this.folder = folder;
    this.disk = disk;
  }

  /**
   * Puts {@code files} into {@code folder} and takes away what the command wrote there before and
   * does not write now. Other files are left alone.
   *
   * @param files content by name relative to the folder, parts separated by {@code /}
   * @param owned every name that the command may write
   * @throws ResultsNotWritten if that cannot be done or another run is writing there
   */
  public static void replace(Path folder, Map<String, byte[]> files, Set<String> owned)
      throws ResultsNotWritten {
    replace(folder, files, owned, Disk.Watch.NONE);
  }

  static void replace(Path folder, Map<String, byte[]> files, Set<String> owned, Disk.Watch watch)
      throws ResultsNotWritten {
    ResultSet set = new ResultSet(folder.toAbsolutePath(), new Disk(watch));
    TreeSet<String> stale = new TreeSet<>(owned);
    stale.removeAll(files.keySet());
    SortedMap<String, byte[]> sorted = new TreeMap<>(files);
    SwapJournal journal = new SwapJournal(List.copyOf(sorted.keySet()), List.copyOf(stale));
    try {
      set.replace(sorted, journal);
    } catch (IOException failure) {
      throw ResultsNotWritten.because(folder, failure, set.state());
    }
  }

  private void replace(SortedMap<String, byte[]> files, SwapJournal journal)
      throws IOException, ResultsNotWritten {
    if (Files.exists(folder) && !Files.isDirectory(folder)) {
      throw new NotDirectoryException(folder + " is a file, not a folder");
    }
    disk.createFolders(folder);
    Optional<FolderLock> lock = FolderLock.on(folder.resolve(LOCK));
    if (lock.isEmpty()) {
      throw new ResultsNotWritten(
          "Another run is writing to " + folder + "; wait for its end or name another folder.");
    }
    try {
      finishEarlierRun();
      requirePlaces(journal);
      stageOrSweep(files);
      swap(journal);
    } finally {
      lock.get().close();
    }
  }

  /** Rolls a journal forward; without one, sweeps away what a killed run had staged. */
  private void finishEarlierRun() throws IOException {
    Path journal = folder.resolve(JOURNAL);
    if (Files.exists(journal)) {
      SwapJournal left = SwapJournal.of(Files.readAllBytes(journal));
      EndOfProgram.waitsFor(() -> apply(left));
    }
    disk.removeAll(folder.resolve(STAGING));
  }

  /** Finds out before anything is changed whether a folder stands where a file has to go. */
  private void requirePlaces(SwapJournal journal) throws IOException {
    List<String> names = new ArrayList<>(journal.moves());
    names.addAll(journal.removals());
    for (String name : names) {
      Path place = folder.resolve(name);
      if (Files.isDirectory(place)) {
        throw new IOException(place + " is a folder");
      }
      Path parent = parentOf(place);
      if (Files.exists(parent) && !Files.isDirectory(parent)) {
        throw new IOException(parent + " is a file, not a folder");
      }
    }
  }

  /** Leaves nothing half staged behind, for a full disk needs the room. */
  private void stageOrSweep(SortedMap<String, byte[]> files) throws IOException {
    try {
      stage(files);
    } catch (IOException failure) {
      try {
        disk.removeAll(folder.resolve(STAGING));
      } catch (IOException second) {
        failure.addSuppressed(second);
      }
      throw failure;
    }
  }

  private void stage(SortedMap<String, byte[]> files) throws IOException {
    Path staging = folder.resolve(STAGING);
    disk.createFolders(staging);
    Set<Path> parents = new TreeSet<>(Set.of(staging));
    for (Map.Entry<String, byte[]> file : files.entrySet()) {
      Path staged = staging.resolve(file.getKey());
      disk.createFolders(parentOf(staged));
      disk.write(staged, file.getValue());
      parents.add(parentOf(staged));
    }
    for (Path parent : parents) {
      disk.force(parent);
    }
  }

  private void swap(SwapJournal journal) throws IOException {
    Path draft = folder.resolve(STAGING).resolve(JOURNAL);
    disk.write(draft, journal.toBytes());
    EndOfProgram.waitsFor(
        () -> {
          disk.move(draft, folder.resolve(JOURNAL));
          disk.force(folder);
          apply(journal);
        });
  }

  private void apply(SwapJournal journal) throws IOException {
    Set<Path> parents = new TreeSet<>(Set.of(folder));
    for (String name : journal.moves()) {
      Path staged = folder.resolve(STAGING).resolve(name);
      Path place = folder.resolve(name);
      disk.createFolders(parentOf(place));
      // A file that is no longer staged took its place before the run was cut off.
      if (Files.exists(staged)) {
        disk.move(staged, place);
      }
      parents.add(parentOf(place));
    }
    for (String name : journal.removals()) {
      disk.remove(folder.resolve(name));
      parents.add(parentOf(folder.resolve(name)));
    }
    for (Path parent : parents) {
      settle(parent);
    }
    disk.remove(folder.resolve(JOURNAL));
    disk.removeAll(folder.resolve(STAGING));
  }

  private void settle(Path parent) throws IOException {
    if (!parent.equals(folder)) {
      disk.removeIfEmpty(parent);
    }
    if (Files.isDirectory(parent)) {
      disk.force(parent);
    }
  }

  private String state() {
    return Files.exists(folder.resolve(JOURNAL))
        ? "the next run to that folder will finish it"
        : "the results there are as they were";
  }

  private static Path parentOf(Path place) {
    return place.resolveSibling("");
  }
}
