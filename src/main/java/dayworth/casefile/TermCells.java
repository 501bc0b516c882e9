package dayworth.casefile;

import dayworth.contract.PartWeek;
import dayworth.contract.Per;
import dayworth.decision.TimeUnit;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

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
          Map.entry("bonus_cap_units", TimeCell.DURATION));

  private static final Set<String> NOT_YET =
      Set.of(
          "basis",
          "prepared_for",
          "prepared_by",
          "reference",
          "valid_until",
          "on_cost_percent",
          "proposal_cost");

  private TermCells() {}

  /** Every name, served or not yet. */
  static List<String> names() {
    return Stream.concat(SERVED.keySet().stream(), NOT_YET.stream()).sorted().toList();
  }

  static boolean isServed(String term) {
    return SERVED.containsKey(term);
  }

  /** Whether cases may use the term one day. */
  static boolean isNotYetServed(String term) {
    return NOT_YET.contains(term);
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
        || parser instanceof Moment.Parser;
  }
}
