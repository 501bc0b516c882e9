package dayworth.casefile;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.decision.Basis;
import dayworth.decision.TimeUnit;
import java.util.List;
import java.util.Map;

/** The terms that terms.csv may have, each with the parser of its value. */
final class TermCells {

  /** What a rate is per. */
  static final WordCell<Per> PER =
      WordCell.<Per>of("word")
          .with("unit", Per.UNIT)
          .with("calendar_day", Per.CALENDAR_DAY)
          .with("week", Per.WEEK);

  private static final Map<String, CellParser<?>> SERVED =
      Map.ofEntries(
          Map.entry("title", (text, style) -> text),
          Map.entry("currency", (text, style) -> text),
          Map.entry(
              "time_unit",
              WordCell.<TimeUnit>of("time unit")
                  .with("day", TimeUnit.DAY)
                  .with("week", TimeUnit.WEEK)
                  .with("hour", TimeUnit.HOUR)
                  .with("shift", TimeUnit.SHIFT)),
          Map.entry("units_per_working_day", TimeCell.DURATION),
          Map.entry("start_date", DateCell.DATE),
          Map.entry("data_date", DateCell.DATE),
          Map.entry("working_days", (CellParser<WorkingDays>) WorkingDays::parse),
          Map.entry("time_related_cost", MoneyCell.AMOUNT),
          Map.entry("time_related_per", PER),
          Map.entry("fixed_cost", MoneyCell.AMOUNT),
          Map.entry("contract_finish", Moment.Parser.MOMENT),
          Map.entry("extension", Moment.Parser.MOMENT),
          Map.entry("damages_rate", MoneyCell.AMOUNT),
          Map.entry("damages_per", PER),
          Map.entry(
              "damages_part_week",
              WordCell.<PartWeek>of("word")
                  .with("pro_rata", PartWeek.PRO_RATA)
                  .with("whole", PartWeek.WHOLE)),
          Map.entry("damages_grace", TimeCell.DURATION),
          Map.entry("damages_cap", MoneyCell.ABOVE_ZERO),
          Map.entry("bonus_rate", MoneyCell.AMOUNT),
          Map.entry("bonus_per", PER),
          Map.entry("bonus_cap", MoneyCell.ABOVE_ZERO),
          Map.entry("bonus_cap_units", TimeCell.DURATION),
          Map.entry("basis", basis()),
          Map.entry("prepared_for", (text, style) -> text),
          Map.entry("prepared_by", (text, style) -> text),
          Map.entry("reference", (text, style) -> text),
          Map.entry("valid_until", DateCell.DATE),
          Map.entry("on_cost_percent", PercentCell.PERCENT),
          Map.entry("proposal_cost", MoneyCell.AMOUNT));

  private TermCells() {}

  private static WordCell<Basis> basis() {
    WordCell<Basis> cell = WordCell.of("basis");
    for (Basis basis : Basis.values()) {
      cell = cell.with(basis.word(), basis);
    }
    return cell;
  }

  /** Every name. */
  static List<String> names() {
    return SERVED.keySet().stream().sorted().toList();
  }

  static boolean isServed(String term) {
    return SERVED.containsKey(term);
  }

  /** The parser of a term that is served. */
  static CellParser<?> parser(String term) {
    return SERVED.get(term);
  }

  /** Whether the term's values are numbers, which show the file's decimal mark. */
  static boolean isNumber(String term) {
    CellParser<?> parser = SERVED.get(term);
    return parser instanceof MoneyCell
        || parser instanceof TimeCell
        || parser instanceof PercentCell
        || parser instanceof Moment.Parser;
  }
}
