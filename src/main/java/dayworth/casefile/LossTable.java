package dayworth.casefile;

import dayworth.buildup.OutputLoss;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/** Reads output_loss.csv: the share of the output that is lost in each week of a spell. */
final class LossTable {

  static final String FILE = "output_loss.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("pattern"),
          Column.needed("week").withNumbers(),
          Column.needed("loss").withNumbers(),
          Column.needed("source"));

  /** A row whose pattern and week are known. */
  private record Read(int line, Optional<OutputLoss.Week> week) {}

  private final Table table;
  private final PatternNames names;
  private final Quantity factor;
  private final Findings findings;
  private final Map<String, SortedMap<Integer, Read>> readByWeek = new HashMap<>();

  private LossTable(Table table, PatternNames names, Quantity factor, Findings findings) {
    this.table = table;
    this.names = names;
    this.factor = factor;
    this.findings = findings;
  }

  /**
   * The losses by the names of their patterns; all faults are reported.
   *
   * @param factor what all losses are multiplied by
   */
  static Map<String, OutputLoss> read(
      PatternNames names, Quantity factor, Optional<String> text, Findings findings) {
    return text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings))
        .map(table -> new LossTable(table, names, factor, findings).losses())
        .orElse(Map.of());
  }

  private Map<String, OutputLoss> losses() {
    table.rows().forEach(this::add);
    Map<String, OutputLoss> losses = new HashMap<>();
    readByWeek.forEach(
        (pattern, weeks) -> {
          checkGaps(weeks);
          losses.put(
              pattern,
              new OutputLoss(
                  weeks.values().stream().flatMap(read -> read.week().stream()).toList()));
        });
    return losses;
  }

  private void add(Row row) {
    Optional<String> pattern = names.name(table, row);
    Cell<Integer> week = table.needed(row, "week", WeekCell.WEEKS, findings);
    Cell<BigDecimal> loss = table.needed(row, "loss", NumberCell.LOSS, findings);
    String source = table.text(row, "source");
    if (pattern.filter(names::isNormal).isPresent()) {
      String right = "no row; labour_hours in labour.csv are those of the normal pattern";
      findings.problem(
          table
              .place(row, "pattern")
              .notice("the normal pattern loses nothing", pattern.get(), right));
    }
    warn(row, loss, source);
    Optional<OutputLoss.Week> scaled =
        loss.value().filter(share -> leavesOutput(row, loss)).map(share -> week(share, source));
    if (pattern.isPresent() && week.value().isPresent()) {
      put(row, pattern.get(), week, new Read(row.line(), scaled));
    }
  }

  private OutputLoss.Week week(BigDecimal loss, String source) {
    return new OutputLoss.Week(Quantity.of(loss).times(factor), source);
  }

  private boolean leavesOutput(Row row, Cell<BigDecimal> loss) {
    Quantity scaled = Quantity.of(loss.value().orElseThrow()).times(factor);
    boolean leaves = scaled.compareTo(Quantity.ONE) < 0;
    if (!leaves) {
      String times = factor.rounded(NumberCell.MOST_DECIMALS, RoundingMode.HALF_UP).toPlainString();
      findings.problem(
          table
              .place(row, "loss")
              .notice(
                  "no output is left, all losses times " + times,
                  loss.text(),
                  "a smaller --loss-factor"));
    }
    return leaves;
  }

  private void warn(Row row, Cell<BigDecimal> loss, String source) {
    if (table.has("source") && source.isEmpty()) {
      String right = "where the figure is from; a loss without a source is an assumption";
      findings.warning(table.place(row, "source").notice("blank", "", right));
    }
    if (loss.value().filter(share -> share.signum() < 0).isPresent()) {
      String right = "it is counted as output gained";
      findings.warning(table.place(row, "loss").notice("a loss below 0", loss.text(), right));
    }
  }

  private void put(Row row, String pattern, Cell<Integer> week, Read read) {
    Read earlier =
        readByWeek
            .computeIfAbsent(pattern, key -> new TreeMap<>())
            .putIfAbsent(week.value().orElseThrow(), read);
    if (earlier != null) {
      String right = "another week; line " + earlier.line() + " has it";
      findings.problem(
          table.place(row, "week").notice("a second row of this week", week.text(), right));
    }
  }

  /** What a week between others loses is not guessed. */
  private void checkGaps(SortedMap<Integer, Read> weeks) {
    int wanted = 1;
    for (Map.Entry<Integer, Read> week : weeks.entrySet()) {
      if (week.getKey() > wanted) {
        String before = wanted == 1 ? "rows from week 1 on" : "a row for week " + wanted;
        findings.problem(
            new Place(FILE, week.getValue().line(), "week")
                .notice("a week before it is missing", week.getKey().toString(), before));
      }
      wanted = week.getKey() + 1;
    }
  }
}
