package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.Verdict;
import dayworth.buildup.Way;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;

/** The figures of one way to do an activity, as tables and texts tell them. */
record WayFigures(ActivityBuildUp built, Way way) {

  /** Hours, weeks and shares that are no decimal fraction are cut here. */
  private static final int DECIMALS = 6;

  BigDecimal duration() {
    return BuildUp.SCALE.units(way.duration());
  }

  /** Time units less than normal; below 0 where it takes longer. */
  BigDecimal saved() {
    return BuildUp.SCALE.units(built.normal() - way.duration());
  }

  Money extra() {
    return way.spell().extra().total();
  }

  /** What a time unit saved costs on average; empty where none is. */
  Optional<Money> perUnitSaved() {
    long saved = built.normal() - way.duration();
    return saved <= 0
        ? Optional.empty()
        : Optional.of(extra().times(BuildUp.SCALE.ticksPerUnit()).dividedBy(saved));
  }

  /** The name of what dominates it; empty where nothing does. */
  Optional<String> dominator() {
    return way.verdict() instanceof Verdict.Dominated dominated
        ? Optional.of(dominated.by())
        : Optional.empty();
  }

  /** In one word: {@code measure}, {@code dominated} or {@code slower}. */
  String verdict() {
    if (way.verdict().isMeasure()) {
      return "measure";
    }
    return dominator().isPresent() ? "dominated" : "slower";
  }

  String sources() {
    return String.join("; ", way.spell().lossSources());
  }

  /** A number of hours or weeks, or a factor. */
  static BigDecimal number(Quantity quantity) {
    return quantity.rounded(DECIMALS, RoundingMode.HALF_UP);
  }
}
