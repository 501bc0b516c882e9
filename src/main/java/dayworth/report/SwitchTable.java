package dayworth.report;

import dayworth.decision.CurveAnswer;
import dayworth.decision.PlanChange;
import dayworth.decision.StepFacts;
import dayworth.network.Measure;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.value.Money;
import java.util.ArrayList;
import java.util.List;

/** Where measures come and go along the curve, from the longest finish shown on. */
final class SwitchTable {

  private static final int MOST_ROWS = 14;
  private static final String INDENT = "    ";

  private record Row(long finish, PlanChange.Kind kind, int index, Measure measure) {}

  private final CurveAnswer answer;
  private final Network network;
  private final List<Row> rows = new ArrayList<>();

  SwitchTable(CurveAnswer answer) {
    this.answer = answer;
    this.network = answer.of().network();
    addFirst();
    for (StepFacts facts : answer.steps()) {
      if (facts.step().to() < answer.latestShown()) {
        facts.changes().stream()
            .filter(change -> change.measure() != Plan.NO_MEASURE)
            .filter(change -> change.kind() != PlanChange.Kind.COMPRESS)
            .filter(change -> change.kind() != PlanChange.Kind.RELAX)
            .forEach(change -> add(facts.step().to(), change.kind(), change.measure()));
      }
    }
  }

  /** What is in use at the first finish that is shown. */
  private void addFirst() {
    long latest = Math.min(answer.latestShown(), answer.curve().longest());
    int steps = 0;
    while (steps < answer.steps().size() && answer.steps().get(steps).step().to() >= latest) {
      steps++;
    }
    Plan first = answer.curve().planAfter(steps);
    for (int i = 0; i < network.size(); i++) {
      if (first.measure(i) != Plan.NO_MEASURE) {
        add(latest, PlanChange.Kind.ON, first.measure(i));
      }
    }
  }

  private void add(long finish, PlanChange.Kind kind, int measure) {
    rows.add(new Row(finish, kind, measure, network.measures().get(measure)));
  }

  /** No lines where no measure is ever used. */
  List<String> lines(int width) {
    if (rows.isEmpty()) {
      return List.of();
    }
    List<Row> shown = rows.subList(0, Math.min(MOST_ROWS, rows.size()));
    TextColumns columns = new TextColumns(width - INDENT.length());
    columns.add(
        answer.of().unit().word() + "s",
        true,
        shown.stream().map(row -> network.scale().text(row.finish())).toList());
    columns.add("", false, shown.stream().map(row -> word(row.kind())).toList());
    columns.add("", false, shown.stream().map(row -> id(row.measure())).toList());
    columns.add("", false, shown.stream().map(row -> name(row.measure())).toList());
    columns.add("extra", true, shown.stream().map(row -> extra(row.measure())).toList());
    List<String> lines = new ArrayList<>(List.of("  Where measures come and go"));
    columns.lines().forEach(line -> lines.add(INDENT + line));
    if (shown.size() < rows.size()) {
      int left = rows.size() - shown.size();
      lines.add(INDENT + Wording.count(left, "row is", "rows are") + " left out: see steps.csv");
    }
    lines.addAll(reasons(shown, width));
    return lines;
  }

  /** Of spells: where their cost comes from, and where their losses are known from. */
  private List<String> reasons(List<Row> shown, int width) {
    SpellReasons reasons =
        new SpellReasons(answer.of(), shown.stream().map(Row::index).distinct().toList());
    List<String> lines = new ArrayList<>();
    if (!reasons.isEmpty()) {
      lines.add("  What the working patterns among them cost more; buildup has the whole sums");
      reasons.table(width - INDENT.length()).forEach(line -> lines.add(INDENT + line));
      reasons.losses().forEach(text -> lines.addAll(Wording.wrap(text, Wording.INDENT, width)));
    }
    return lines;
  }

  /**
   * Against the normal way, without its package; whole, as steps.csv and buildup have the cents.
   */
  private String extra(Measure measure) {
    Money more = measure.cost().minus(network.activity(measure.activity()).normalCost());
    return new MoneyLook(0).text(more.cents());
  }

  private static String word(PlanChange.Kind kind) {
    return switch (kind) {
      case OFF -> "off";
      case EXCHANGE -> "now";
      default -> "on";
    };
  }

  private String id(Measure measure) {
    return Wording.safe(network.activity(measure.activity()).id());
  }

  private String name(Measure measure) {
    String name = Wording.safe(measure.name());
    return measure.inPackage().isEmpty()
        ? name
        : name
            + " ("
            + Wording.safe(network.measures().packages().get(measure.inPackage().getAsInt()).name())
            + ")";
  }
}
