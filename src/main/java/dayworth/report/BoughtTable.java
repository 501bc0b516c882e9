package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.MeetAnswer;
import dayworth.decision.MeetAnswer.Bought;
import dayworth.network.MeasurePackage;
import dayworth.network.Network;
import dayworth.network.Plan;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/** What a plan shortens against the plan as it stands, and the chains that make it do so. */
final class BoughtTable {

  private static final int MOST_ROWS = 40;

  /** Names are cut so far that all columns have room, if that is possible. */
  private static final List<Integer> NAME_WIDTHS = List.of(36, 28, 20, 12);

  private static final String INDENT = "    ";

  private final MeetAnswer answer;
  private final Case of;
  private final Network network;
  private final List<Bought> shown;
  private final MoneyLook look;

  BoughtTable(MeetAnswer answer) {
    this.answer = answer;
    this.of = answer.of();
    this.network = of.network();
    List<Bought> all = answer.bought();
    this.shown = all.subList(0, Math.min(MOST_ROWS, all.size()));
    List<BigDecimal> amounts = new ArrayList<>(List.of(answer.extra().cents()));
    shown.forEach(bought -> amounts.add(bought.cost().cents()));
    shown.forEach(bought -> price(bought).ifPresent(amounts::add));
    packages().forEach(each -> amounts.add(each.cost().cents()));
    this.look = MoneyLook.of(amounts);
  }

  MoneyLook look() {
    return look;
  }

  List<String> lines(int width) {
    List<TextColumns> tries =
        NAME_WIDTHS.stream().map(most -> columns(width - INDENT.length(), most)).toList();
    TextColumns columns =
        tries.stream()
            .filter(wide -> wide.dropped().isEmpty())
            .findFirst()
            .orElse(tries.get(tries.size() - 1));
    List<String> lines = new ArrayList<>(List.of("  Against the plan as it stands"));
    columns.lines().forEach(line -> lines.add(INDENT + line));
    if (!columns.dropped().isEmpty()) {
      String names = String.join(", ", columns.dropped());
      lines.addAll(Wording.wrap("No room for: " + names, INDENT, width));
    }
    int left = answer.bought().size() - shown.size();
    if (left > 0) {
      lines.add(INDENT + Wording.count(left, "row is", "rows are") + " left out: see plan.csv");
    }
    return lines;
  }

  private TextColumns columns(int width, int mostName) {
    TextColumns columns = new TextColumns(width);
    columns.add(
        "",
        false,
        column(bought -> id(bought.activity()), each -> Wording.safe(each.name()), "all"));
    if (shown.stream().anyMatch(bought -> !what(bought, mostName).isEmpty())) {
      columns.add("", false, column(bought -> what(bought, mostName), each -> "package", ""));
    }
    columns.add(of.unit().word() + "s", true, column(this::fromTo, BoughtTable::nothing, ""));
    columns.add(
        "bought",
        true,
        column(bought -> units(bought.ticks()), BoughtTable::nothing, units(allTicks())));
    columns.add(
        "a " + of.unit().word(),
        true,
        column(bought -> price(bought).map(look::text).orElse(""), BoughtTable::nothing, ""));
    columns.add(
        "price",
        true,
        column(
            bought -> look.text(bought.cost().cents()),
            each -> look.text(each.cost().cents()),
            total()));
    columns.add("on chain", false, column(BoughtTable::chains, BoughtTable::nothing, ""));
    return columns;
  }

  /** The chains by the numbers that the table gives them. */
  List<String> chains(int width) {
    List<List<Integer>> chains = answer.chains();
    List<String> lines = new ArrayList<>(Wording.wrap(level(), Wording.INDENT, width));
    for (int c = 0; c < chains.size(); c++) {
      String start = INDENT + (c + 1) + "  ";
      List<String> ids = chains.get(c).stream().map(this::id).toList();
      lines.add(start + Wording.ids(ids, width - start.length()));
    }
    return lines;
  }

  private String level() {
    BigInteger count = answer.chainCount();
    boolean one = count.equals(BigInteger.ONE);
    int critical = of.criticalCount(answer.curve().asked().timing());
    BigInteger left = count.subtract(BigInteger.valueOf(answer.chains().size()));
    return Wording.grouped(new BigDecimal(count))
        + (one ? " chain takes " : " chains take ")
        + Wording.duration(of, answer.finish().duration())
        + ", and "
        + critical
        + " of "
        + Wording.count(network.size(), "activity", "activities")
        + (critical == 1 ? " is critical" : " are critical")
        + (left.signum() == 0
            ? ":"
            : "; these "
                + answer.chains().size()
                + (passAll() ? " pass all that is shortened:" : " are some of them:"));
  }

  private boolean passAll() {
    return answer.bought().stream().noneMatch(bought -> bought.onChains().isEmpty());
  }

  private List<String> column(
      Function<Bought, String> cell, Function<MeasurePackage, String> ofPackage, String last) {
    List<String> cells = new ArrayList<>(shown.stream().map(cell).toList());
    packages().stream().map(ofPackage).forEach(cells::add);
    cells.add(last);
    return cells;
  }

  private String id(int activity) {
    return Wording.safe(network.activity(activity).id());
  }

  private static String nothing(MeasurePackage each) {
    return "";
  }

  private List<MeasurePackage> packages() {
    return answer.packages().stream().map(network.measures().packages()::get).toList();
  }

  /** The measure where it is done by one, else the activity's name. */
  private String what(Bought bought, int most) {
    String name =
        Wording.safe(
            bought.measure() == Plan.NO_MEASURE
                ? network.activity(bought.activity()).name()
                : network.measures().get(bought.measure()).name());
    return name.length() <= most ? name : name.substring(0, most - 2).strip() + "..";
  }

  private String fromTo(Bought bought) {
    long normal = network.activity(bought.activity()).normal();
    return units(normal) + " to " + units(normal - bought.ticks());
  }

  private String units(long ticks) {
    return Wording.grouped(network.scale().units(ticks));
  }

  private long allTicks() {
    return answer.bought().stream().mapToLong(Bought::ticks).sum();
  }

  private String total() {
    return look.text(answer.extra().cents());
  }

  private Optional<BigDecimal> price(Bought bought) {
    return bought.pricePerTick().map(price -> price.times(network.scale().ticksPerUnit()).cents());
  }

  /** What pays by itself, or shortens the span of a running cost, need be on none. */
  private static String chains(Bought bought) {
    return bought.onChains().isEmpty()
        ? "none"
        : bought.onChains().stream()
            .map(chain -> String.valueOf(chain + 1))
            .collect(Collectors.joining(" "));
  }
}
