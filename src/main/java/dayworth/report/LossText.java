package dayworth.report;

import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.decision.Case;
import dayworth.value.Quantity;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** The losses of output that an answer rests on: each is an assumption, and is told with whose. */
final class LossText {

  private LossText() {}

  /** A sentence for each source: what is lost at which pattern. */
  static List<String> of(List<Pattern> patterns) {
    Map<String, List<String>> bySource = new LinkedHashMap<>();
    for (Pattern pattern : patterns) {
      OutputLoss loss = pattern.loss();
      String source = loss.weeks().isEmpty() ? "" : ". Source: " + source(loss, weeks(loss));
      bySource
          .computeIfAbsent(source, key -> new ArrayList<>())
          .add(Wording.safe(pattern.name()) + " " + share(loss));
    }
    return bySource.entrySet().stream()
        .map(each -> "Output lost: " + String.join("; ", each.getValue()) + each.getKey() + ".")
        .toList();
  }

  /** Said where all losses are multiplied. */
  static Optional<String> factor(Case of) {
    Quantity factor = of.buildUp().lossFactor();
    return factor.equals(Quantity.ONE)
        ? Optional.empty()
        : Optional.of(
            "All losses of output here are the case's losses times "
                + WayFigures.number(factor).toPlainString()
                + " (--loss-factor).");
  }

  /** Where the figures of the first weeks are from. */
  static String source(OutputLoss loss, int upTo) {
    return loss.sources(upTo).stream()
        .map(source -> source.isEmpty() ? "no source given" : Wording.safe(source))
        .collect(Collectors.joining("; "));
  }

  private static String share(OutputLoss loss) {
    if (loss.weeks().isEmpty()) {
      return "none, for none is given";
    }
    int last = weeks(loss);
    String first = percent(loss, 1);
    return loss.in(1).equals(loss.in(last))
        ? first
        : first + " in week 1 to " + percent(loss, last) + " from week " + last + " on";
  }

  static String percent(OutputLoss loss, int week) {
    Quantity percent = loss.in(week).times(Quantity.of(100));
    return WayFigures.number(percent).toPlainString() + " %";
  }

  private static int weeks(OutputLoss loss) {
    return loss.weeks().size();
  }
}
