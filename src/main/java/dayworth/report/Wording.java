package dayworth.report;

import dayworth.decision.Case;
import dayworth.decision.TimeUnit;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Sentences and lists for a terminal: wrapped or cut, never with codes from a file. */
final class Wording {

  static final String INDENT = "  ";

  private Wording() {}

  /** Text from a file without control characters, which a terminal might obey. */
  static String safe(String text) {
    return text.replaceAll("\\p{Cntrl}", "?");
  }

  /** The plan with every activity its normal way; with a status it is what things have come to. */
  static String asPlanned(Case of) {
    return of.progress().isPresent() ? "as it stands" : "as planned";
  }

  /** What is done at the data date; empty for a case without one. */
  static String status(Case of) {
    return of.progress()
        .map(
            done ->
                String.format(
                    Locale.ROOT,
                    "%,d finished, %,d in progress at the end of %s; everything below is of the"
                        + " work to go.",
                    done.finished(),
                    done.inProgress(),
                    Dates.spoken(done.dataDate())))
        .orElse("");
  }

  /** The unit's name for so many of it. */
  static String unit(Case of, BigDecimal units) {
    String word = of.unit().word();
    return units.compareTo(BigDecimal.ONE) == 0 ? word : word + "s";
  }

  /** A duration with its unit: {@code 1 day}, {@code 2.5 days}. */
  static String duration(Case of, long ticks) {
    BigDecimal units = of.network().scale().units(ticks);
    return grouped(units) + " " + unit(of, units);
  }

  /** A duration and, where there are dates, its finish date: {@code 48 days (Wed 11 Nov 2026)}. */
  static String finish(Case of, long ticks) {
    return duration(of, ticks) + new Dates(of).spokenFinish(" (", ticks, ")");
  }

  /** A duration, days being called working days. */
  static String workingDuration(Case of, long ticks) {
    BigDecimal units = of.network().scale().units(ticks);
    String working = of.unit() == TimeUnit.DAY ? "working " : "";
    return grouped(units) + " " + working + unit(of, units);
  }

  /** A finish by its date, or without dates by its duration, each with a word before it. */
  static String when(Case of, long ticks, String beforeDate, String beforeDuration) {
    return new Dates(of).areKnown()
        ? new Dates(of).spokenFinish(beforeDate, ticks, "")
        : beforeDuration + workingDuration(of, ticks);
  }

  /** A count with the word for what is counted. */
  static String count(int count, String one, String many) {
    return String.format(Locale.ROOT, "%,d %s", count, count == 1 ? one : many);
  }

  /** A number with its thousands grouped, and the decimals that it has. */
  static String grouped(BigDecimal number) {
    return String.format(Locale.ROOT, "%,." + Math.max(0, number.scale()) + "f", number);
  }

  /** Ids side by side, cut so that they fit. */
  static String ids(List<String> ids, int width) {
    String all = safe(String.join(" ", ids));
    for (int kept = ids.size() - 1; all.length() > width && kept > 0; kept--) {
      String some = safe(String.join(" ", ids.subList(0, kept)));
      all = some + " and " + (ids.size() - kept) + " more";
    }
    return all;
  }

  /** Prose broken at blanks; each line begins with {@code indent}. */
  static List<String> wrap(String prose, String indent, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder(indent);
    for (String word : prose.split(" ", -1)) {
      boolean first = line.length() == indent.length();
      if (!first && line.length() + 1 + word.length() > width) {
        lines.add(line.toString());
        line = new StringBuilder(indent);
        first = true;
      }
      line.append(first ? "" : " ").append(word);
    }
    lines.add(line.toString());
    return lines;
  }

  /** The first line: the answer, and the currency once at its end. */
  static String answer(String sentence, String currency, int width) {
    if (currency.isEmpty()) {
      return sentence;
    }
    int room = width - 2 - sentence.length() - currency.length();
    return sentence + " ".repeat(Math.max(2, room)) + safe(currency);
  }
}
