package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.contract.Terms;
import dayworth.decision.Case;
import dayworth.decision.CheckAnswer;
import dayworth.decision.CheckQuestion;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.TimeUnit;
import dayworth.decision.Watcher;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Network;
import dayworth.report.CheckText;
import dayworth.report.CurveFiles;
import dayworth.report.CurveText;
import dayworth.report.Style;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.Random;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The reader answers whatever the bytes are, and what it calls sound can be computed. */
class ReaderFuzzTest {

  private static final Path CORE = Path.of("cases", "ferry-berth-core");
  private static final Path DATED =
      Path.of("src", "test", "resources", "demo", "ferry-berth-dated");
  private static final Path STATUS =
      Path.of("src", "test", "resources", "demo", "ferry-berth-status");
  private static final List<String> CORE_FILES =
      List.of("activities.csv", "links.csv", "terms.csv");
  private static final List<String> DATED_FILES = List.of("holidays.csv", "terms.csv");
  private static final List<String> STATUS_FILES = List.of("progress.csv", "terms.csv");
  private static final int CASES = 2000;

  /** What hurts readers of tables most often. */
  private static final List<String> SPLICES =
      List.of(
          ",",
          ";",
          "\"",
          "\"\"",
          "\n",
          "\r\n",
          "\r",
          "\t",
          "-",
          ".",
          "0",
          "999999",
          "1e9",
          "\u00fc",
          "\uFEFF",
          "A3",
          "FS",
          "id",
          " ",
          "\u0000",
          "=1+1",
          "2027-02-30",
          "0001-01-01",
          "2999-12-31",
          "2027-07-16",
          "2027-07-19",
          "week",
          "calendar_day",
          "whole",
          "/7");

  private static final List<String> DATES =
      List.of("2027-03-15", "2027-05-01", "1900-01-01", "2999-12-31", "2027-11-23");
  private static final List<String> AMOUNTS =
      List.of("0", "1", "0.0001", "333.33", "1000000000000", "");
  private static final List<String> COUNTS = List.of("0", "1", "0.001", "7.5", "1000000", "");
  private static final List<String> PER = List.of("unit", "calendar_day", "week", "");
  private static final List<String> WRONG = List.of("x", "-1", "2027-02-29", "month", "0000-00-00");

  /** What terms may be, as far out as they may. */
  private static final Map<String, List<String>> TERMS =
      new TreeMap<>(
          Map.ofEntries(
              Map.entry("time_unit", List.of("day", "week", "hour", "shift")),
              Map.entry("units_per_working_day", List.of("0.001", "1", "7.5", "24", "1000000")),
              Map.entry("start_date", DATES),
              Map.entry(
                  "working_days",
                  List.of("Mon Tue Wed Thu Fri", "Sun", "Mon Tue Wed Thu Fri Sat", "Mon Sat Sun")),
              Map.entry("time_related_cost", AMOUNTS),
              Map.entry("time_related_per", PER),
              Map.entry("contract_finish", List.of("2027-11-23", "2999-12-31", "0", "17", "1e6")),
              Map.entry("damages_rate", AMOUNTS),
              Map.entry("damages_per", PER),
              Map.entry("damages_part_week", List.of("whole", "pro_rata")),
              Map.entry("damages_grace", COUNTS),
              Map.entry("damages_cap", AMOUNTS),
              Map.entry("bonus_rate", AMOUNTS),
              Map.entry("bonus_per", PER),
              Map.entry("bonus_cap", AMOUNTS),
              Map.entry("bonus_cap_units", COUNTS)));

  @TempDir private Path folder;

  @Test
  void theReaderNeverThrowsAndSoundCasesCanBeComputed() throws IOException {
    changeBytes(CORE, CORE_FILES, CASES);
  }

  @Test
  void withDatesItNeverThrowsEither() throws IOException {
    for (String file : List.of("activities.csv", "links.csv")) {
      Files.copy(DATED.resolve(file), folder.resolve(file));
    }
    changeBytes(DATED, DATED_FILES, CASES / 4);
  }

  @Test
  void withAStatusItNeverThrowsEither() throws IOException {
    for (String file : List.of("activities.csv", "links.csv", "holidays.csv")) {
      Files.copy(STATUS.resolve(file), folder.resolve(file));
    }
    changeBytes(STATUS, STATUS_FILES, CASES / 4);
  }

  /** Rows of a status, right and wrong, in any order. */
  @Test
  void anyStatusIsReadOrRefused() throws IOException {
    CaseOnDisk disk =
        new CaseOnDisk(folder)
            .with(
                "activities.csv",
                """
                id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors,not_before
                A,5,100,3,120,,
                B,20,100,12,300,A,2
                C,7.5,100,,,A,2027-03-20
                D,3,0,1,90,B;C,
                E,0,0,,,D,
                """)
            .with(
                "links.csv",
                """
                predecessor,successor,relation,lag
                A,D,FF,9
                B,C,SS,2.5
                C,E,SF,4
                """);
    int sound = 0;
    int told = 0;
    for (int seed = 0; seed < CASES / 2; seed++) {
      Random random = new Random(seed);
      disk.with("terms.csv", "term,value\nstart_date,2027-03-01\n" + statusTerms(random));
      disk.with("progress.csv", status(random));
      if (isSound(seed)) {
        sound++;
        canBeTold(disk.sound());
        told += disk.sound().progress().isPresent() ? 1 : 0;
      }
    }
    assertTrue(told > CASES / 40, "too few cases are sound: " + sound);
    assertTrue(sound < CASES / 2 - CASES / 40, "too few are refused: " + sound);
  }

  /** Sections and running costs, right and wrong, as far out as they may be. */
  @Test
  void anySectionsAndRunningCostsAreReadOrRefused() throws IOException {
    CaseOnDisk disk =
        new CaseOnDisk(folder)
            .with(
                "activities.csv",
                """
                id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors
                A,5,100,3,120,
                B,8,100,5,300.01,A
                C,4,100,,,A
                """);
    int sound = 0;
    for (int seed = 0; seed < CASES / 4; seed++) {
      Random random = new Random(seed);
      boolean dated = random.nextInt(4) > 0;
      disk.with(
          "terms.csv", dated ? "term,value\nstart_date,2027-03-01\n" : "term,value\ntitle,T\n");
      List<String> per = dated ? PER : List.of("unit", "");
      disk.with("sections.csv", sections(random, per));
      disk.with("running.csv", running(random, per));
      if (isSound(seed)) {
        sound++;
        canBeTold(disk.sound());
      }
    }
    assertTrue(sound > CASES / 40, "too few cases are sound: " + sound);
    assertTrue(sound < CASES / 4 - CASES / 40, "too few are refused: " + sound);
  }

  private static String sections(Random random, List<String> per) {
    StringBuilder text =
        new StringBuilder(
            "section,activity,due,damages_rate,damages_per,damages_grace,damages_cap,bonus_rate\n");
    for (int k = random.nextInt(3); k > 0; k--) {
      String due = List.of("0", "4", "7.5", "2027-03-06", "2027-03-12").get(random.nextInt(5));
      String rate = any(random, AMOUNTS);
      String grace = rate.isEmpty() ? "" : any(random, COUNTS);
      String cap = rate.isEmpty() ? "" : any(random, AMOUNTS);
      String row =
          String.join(
              ",",
              "S" + k,
              id(random),
              due,
              rate,
              any(random, per),
              grace,
              cap,
              any(random, AMOUNTS));
      text.append(row).append('\n');
    }
    return text.toString();
  }

  private static String running(Random random, List<String> per) {
    StringBuilder text = new StringBuilder("name,from_activity,to_activity,rate,per\n");
    for (int k = random.nextInt(3); k > 0; k--) {
      String rate = any(random, AMOUNTS.subList(0, 5));
      text.append(String.join(",", "R" + k, id(random), id(random), rate, any(random, per)));
      text.append('\n');
    }
    return text.toString();
  }

  private static String id(Random random) {
    return random.nextInt(40) == 0 ? "X" : any(random, List.of("A", "B", "C"));
  }

  private static String any(Random random, List<String> from) {
    return random.nextInt(60) == 0 ? any(random, WRONG) : from.get(random.nextInt(from.size()));
  }

  private static String statusTerms(Random random) {
    String data = random.nextInt(50) == 0 ? "" : "data_date,2027-03-" + day(random, 10, 21) + "\n";
    return switch (random.nextInt(4)) {
      case 0 -> data + "time_unit,week\nworking_days,Mon Tue Wed Thu Fri Sat\n";
      case 1 -> data + "time_unit,hour\nunits_per_working_day,7.5\ncontract_finish,2027-03-09\n";
      case 2 -> data + "contract_finish,30\ndamages_rate,10\ndamages_per,calendar_day\n";
      default -> data;
    };
  }

  private static String status(Random random) {
    StringBuilder text = new StringBuilder("activity,started,finished,remaining_duration");
    boolean crash = random.nextInt(3) == 0;
    text.append(crash ? ",remaining_crash_duration,remaining_crash_cost\n" : "\n");
    for (String id : List.of("A", "B", "C", "D", "E")) {
      text.append(row(id, random));
      if (crash) {
        text.append(random.nextInt(3) == 0 ? ",0,50" : ",,");
      }
      text.append('\n');
    }
    return text.toString();
  }

  private static String row(String id, Random random) {
    int state = random.nextInt(id.equals("E") ? 2 : 4);
    String started = state == 0 ? "" : "2027-03-" + day(random, 1, 10);
    String finished = state == 1 ? "2027-03-" + day(random, 8, 12) : "";
    String rest = state > 1 ? List.of("0", "1", "2.5", "3.333", "30").get(random.nextInt(5)) : "";
    if (random.nextInt(80) == 0) {
      rest = WRONG.get(random.nextInt(WRONG.size()));
    }
    return String.join(",", id, started, finished, rest);
  }

  private static String day(Random random, int first, int last) {
    int day = first + random.nextInt(last - first + 1);
    return (day < 10 ? "0" : "") + day;
  }

  private void changeBytes(Path from, List<String> files, int cases) throws IOException {
    int sound = 0;
    for (int seed = 0; seed < cases; seed++) {
      Random random = new Random(seed);
      for (String file : files) {
        byte[] bytes = Files.readAllBytes(from.resolve(file));
        Files.write(folder.resolve(file), changed(bytes, random));
      }
      sound += isSound(seed) ? 1 : 0;
    }
    assertTrue(sound > cases / 20, "the changes leave too few cases sound: " + sound);
    assertTrue(sound < cases - cases / 20, "the changes break too few cases: " + sound);
  }

  @Test
  void anyTermsTogetherAreReadOrRefused() throws IOException {
    CaseOnDisk disk =
        new CaseOnDisk(folder)
            .with(
                "activities.csv",
                """
                id,normal_duration,normal_cost,crash_duration,crash_cost,predecessors,not_before
                A,5,100,3,120,,
                B,20,100,12,300,A,2
                """)
            .with("holidays.csv", "date\n2027-03-15\n2027-03-26\n2027-05-01\n");
    int sound = 0;
    for (int seed = 0; seed < CASES; seed++) {
      disk.with("terms.csv", terms(new Random(seed)));
      boolean isSound = isSound(seed);
      sound += isSound ? 1 : 0;
      if (isSound && seed % 5 == 0) {
        canBeTold(disk.sound());
      }
    }
    assertTrue(sound > CASES / 20, "too few cases are sound: " + sound);
  }

  private static void canBeTold(Case read) {
    boolean longDays = read.terms().calendar().filter(d -> d.dayLength().ticks() < 10).isPresent();
    if (longDays && read.unit() != TimeUnit.DAY) {
      return; // a row for each of very many days
    }
    try {
      CurveAnswer answer = CurveQuestion.ask(read, OptionalLong.empty(), 0, Watcher.NONE);
      CheckAnswer facts = CheckQuestion.ask(read);
      assertTrue(CheckText.lines(facts, Style.PLAIN, 94).size() > 3);
      assertTrue(facts.firstChains().stream().flatMap(List::stream).allMatch(read::isToGo));
      assertTrue(CurveText.lines(answer, Style.PLAIN, 94).size() > 5);
      assertEquals(5, CurveFiles.of(answer, "1").size());
    } catch (FinishTooEarly impossible) {
      throw new AssertionError(impossible);
    }
  }

  private static String terms(Random random) {
    StringBuilder text = new StringBuilder("term,value\n");
    TERMS.forEach(
        (term, values) -> {
          boolean needed = term.equals("start_date") || term.equals("contract_finish");
          if (needed ? random.nextInt(8) > 0 : random.nextInt(3) > 0) {
            List<String> from = random.nextInt(100) == 0 ? WRONG : values;
            text.append(term).append(',');
            text.append(from.get(random.nextInt(from.size()))).append('\n');
          }
        });
    return text.toString();
  }

  private boolean isSound(int seed) {
    try {
      Reading reading = CaseReader.read(folder, TimeScale.WHOLE);
      if (reading instanceof Reading.Sound sound) {
        Network network = sound.of().network();
        Curve curve = Stepping.curve(network, PieceWitness.NONE);
        assertTrue(curve.shortest() >= 0, "seed " + seed);
        Terms terms = sound.of().terms();
        assertTrue(terms.at(curve.longest()).damages().signum() >= 0, "seed " + seed);
        assertTrue(terms.at(curve.shortest()).bonus().signum() >= 0, "seed " + seed);
        assertTrue(terms.bends().size() < 10, "seed " + seed);
        terms
            .calendar()
            .ifPresent(dates -> assertTrue(dates.finishDate(curve.longest()).getYear() > 1800));
        return true;
      }
      return false;
    } catch (RuntimeException e) {
      throw new AssertionError("seed " + seed, e);
    }
  }

  private static byte[] changed(byte[] bytes, Random random) {
    byte[] text = bytes;
    int changes = random.nextInt(3);
    for (int k = 0; k < changes; k++) {
      int at = random.nextInt(text.length + 1);
      text =
          switch (random.nextInt(5)) {
            case 0 -> spliced(text, at, at, new byte[] {(byte) random.nextInt(256)});
            case 1 -> spliced(text, at, Math.min(text.length, at + 1), new byte[0]);
            case 2 ->
                spliced(text, at, Math.min(text.length, at + random.nextInt(40)), new byte[0]);
            case 3 -> spliced(text, at, Math.min(text.length, at + 1), digit(random));
            default -> spliced(text, at, at, splice(random));
          };
    }
    return text;
  }

  private static byte[] digit(Random random) {
    return new byte[] {(byte) ('0' + random.nextInt(10))};
  }

  private static byte[] splice(Random random) {
    return SPLICES.get(random.nextInt(SPLICES.size())).getBytes(StandardCharsets.UTF_8);
  }

  private static byte[] spliced(byte[] text, int from, int to, byte[] instead) {
    byte[] joined = new byte[from + instead.length + text.length - to];
    System.arraycopy(text, 0, joined, 0, from);
    System.arraycopy(instead, 0, joined, from, instead.length);
    System.arraycopy(text, to, joined, from + instead.length, text.length - to);
    return joined;
  }
}
