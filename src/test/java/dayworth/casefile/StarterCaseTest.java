package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.Case;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What {@code begin} writes, and when it writes nothing. */
class StarterCaseTest {

  private static final Set<String> FILES =
      Set.of("README.txt", "activities.csv", "holidays.csv", "links.csv", "terms.csv");

  @TempDir private Path folder;

  private static Set<String> names(Path in) throws IOException {
    try (Stream<Path> entries = Files.list(in)) {
      return entries.map(entry -> entry.getFileName().toString()).collect(Collectors.toSet());
    }
  }

  private Path written(String name) throws StarterRefused {
    Path target = folder.resolve(name);
    StarterCase.write(target);
    return target;
  }

  @Test
  void aNewFolderHoldsTheWholeCaseAndNothingElse() throws IOException, StarterRefused {
    Path target = folder.resolve("far").resolve("bridge");
    List<Path> files = StarterCase.write(target);
    assertEquals(FILES, names(target));
    assertEquals(
        FILES,
        files.stream().map(file -> file.getFileName().toString()).collect(Collectors.toSet()));
    assertEquals(Set.of("bridge"), names(folder.resolve("far")));
  }

  @Test
  void anEmptyFolderIsFilled() throws IOException, StarterRefused {
    Files.createDirectory(folder.resolve("bridge"));
    assertEquals(FILES, names(written("bridge")));
    assertEquals(Set.of("bridge"), names(folder));
  }

  @Test
  void aFolderWithSomethingInItIsRefusedAndLeftAsItIs() throws IOException {
    Path target = Files.createDirectory(folder.resolve("bridge"));
    Files.writeString(target.resolve(".hidden"), "mine");
    StarterRefused refused = assertThrows(StarterRefused.class, () -> StarterCase.write(target));
    assertEquals(target + " is there and is not empty; name a new folder.", refused.getMessage());
    assertEquals(Set.of(".hidden"), names(target));
  }

  @Test
  void aFileIsRefusedAndLeftAsItIs() throws IOException {
    Path target = Files.writeString(folder.resolve("bridge"), "mine");
    StarterRefused refused = assertThrows(StarterRefused.class, () -> StarterCase.write(target));
    assertEquals(target + " is there and is no folder; name a new folder.", refused.getMessage());
    assertEquals("mine", Files.readString(target));
  }

  @Test
  void aPlaceThatCannotBeWrittenIsToldInOneSentence() throws IOException {
    Path file = Files.writeString(folder.resolve("file"), "mine");
    Path target = file.resolve("bridge");
    StarterRefused refused = assertThrows(StarterRefused.class, () -> StarterCase.write(target));
    assertTrue(
        refused.getMessage().startsWith(target + " could not be written: "), refused.getMessage());
    assertEquals(Set.of("file"), names(folder));
  }

  @Test
  void theCaseIsSoundAndNothingInItIsDoubtful() throws StarterRefused {
    assertEquals(List.of(), new CaseOnDisk(written("bridge")).warnings());
  }

  /**
   * By hand, as planned: T1 from 2 to 22, T2 to 28, G1 to 30; R1 starts 3 after P1, at 33, and
   * takes 9 to 42; Z1 to 44. Shortest: T1 from 2 to 16, T2 to 22, G1 to 24, P1 may end at 29; R1
   * starts 3 after P1, at 27, and takes 6 to 33; Z1 to 35.
   */
  @Test
  void theCaseHasSomethingToFind() throws StarterRefused {
    Case read = new CaseOnDisk(written("bridge")).sound();
    assertEquals(44, Timing.earliest(read.network(), Plan.allNormal(read.network())).finish());
    Curve curve = Stepping.curve(read.network(), PieceWitness.NONE);
    assertEquals(35, curve.shortest());
    assertTrue(curve.steps().size() > 2, curve.steps().toString());
  }

  /** The contract's columns and terms, as far as they are served without a warning. */
  @Test
  void everyColumnAndTermIsUsedAndExplained() throws IOException, StarterRefused {
    Path target = written("bridge");
    String readme = Files.readString(target.resolve("README.txt"));
    Set<String> words = new TreeSet<>();
    for (String file : List.of("activities.csv", "holidays.csv", "links.csv")) {
      List<String> rows = Files.readAllLines(target.resolve(file));
      List<String> columns = List.of(rows.get(0).split(",", -1));
      words.addAll(columns);
      for (int i = 0; i < columns.size(); i++) {
        int column = i;
        assertTrue(
            rows.stream().skip(1).anyMatch(row -> !row.split(",", -1)[column].isBlank()),
            columns.get(column));
      }
    }
    Files.readAllLines(target.resolve("terms.csv")).stream()
        .skip(1)
        .forEach(row -> words.add(row.substring(0, row.indexOf(','))));
    assertEquals(
        Set.of(
            "id",
            "name",
            "group",
            "normal_duration",
            "normal_cost",
            "crash_duration",
            "crash_cost",
            "divisible",
            "predecessors",
            "not_before",
            "predecessor",
            "successor",
            "relation",
            "lag",
            "title",
            "currency",
            "time_unit",
            "units_per_working_day",
            "start_date",
            "working_days",
            "time_related_cost",
            "time_related_per",
            "fixed_cost",
            "contract_finish",
            "damages_rate",
            "damages_per",
            "damages_part_week",
            "damages_grace",
            "damages_cap",
            "bonus_rate",
            "bonus_per",
            "bonus_cap",
            "bonus_cap_units",
            "date"),
        words);
    words.addAll(
        List.of(
            "data_date",
            "activity",
            "started",
            "finished",
            "remaining_duration",
            "remaining_crash_duration",
            "remaining_crash_cost",
            "section",
            "due",
            "name",
            "from_activity",
            "to_activity",
            "rate",
            "per"));
    for (String word : words) {
      assertTrue(readme.contains("\n  " + word + " "), word);
    }
  }
}
