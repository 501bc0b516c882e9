package dayworth.report;

import dayworth.contract.Due;
import dayworth.decision.Case;
import dayworth.decision.CheckAnswer;
import dayworth.decision.CheckAnswer.NeverCritical;
import dayworth.decision.TimeUnit;
import dayworth.engine.Ways;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The answer of {@code dayworth check} for a terminal. */
public final class CheckText {

  private static final int MOST_NOTES = 12;
  private static final String NOTE_INDENT = "        ";

  private final CheckAnswer answer;
  private final Case of;
  private final Network network;
  private final Dates dates;
  private final int width;

  private CheckText(CheckAnswer answer, int width) {
    this.answer = answer;
    this.of = answer.of();
    this.network = of.network();
    this.dates = new Dates(of);
    this.width = Math.min(width, CurveText.WIDEST);
  }

  /** The lines of the answer; the first says it all. */
  public static List<String> lines(CheckAnswer answer, Style style, int width) {
    CheckText text = new CheckText(answer, width);
    List<String> lines = new ArrayList<>();
    lines.add(style.bold(text.sentence()));
    lines.add("");
    String status = Wording.status(text.of);
    if (!status.isEmpty()) {
      text.add(lines, status);
    }
    LossText.factor(text.of).ifPresent(said -> text.add(lines, said));
    lines.addAll(text.facts());
    return lines;
  }

  /** What its owner should know of a sound case: whose compression gains nothing. */
  public static List<String> notes(CheckAnswer answer, int width) {
    return new CheckText(answer, width).notes();
  }

  private String sentence() {
    List<String> with = new ArrayList<>();
    if (!of.warnings().isEmpty()) {
      with.add(Wording.count(of.warnings().size(), "warning", "warnings"));
    }
    if (!answer.neverCritical().isEmpty()) {
      with.add(Wording.count(answer.neverCritical().size(), "note", "notes"));
    }
    long finish = answer.asPlanned().finish();
    return "The case is sound"
        + (with.isEmpty() ? "" : ", with " + String.join(" and ", with))
        + (of.progress().isPresent() ? ". As it stands: " : ". As planned: ")
        + (dates.areKnown()
            ? dates.spokenFinish("", finish, "")
            : Wording.workingDuration(of, finish))
        + of.terms().contractFinish().map(due -> lateness(due, finish)).orElse("")
        + ".";
  }

  /** In calendar days where there are dates. */
  private String lateness(Due due, long finish) {
    Optional<Integer> days = dates.daysAfter(due, finish);
    long late = days.map(Integer::longValue).orElse(finish - due.ticks());
    if (late == 0) {
      return ", on time";
    }
    String amount =
        days.map(Math::abs)
            .map(count -> Wording.count(count, "calendar day", "calendar days"))
            .orElseGet(() -> Wording.duration(of, Math.abs(late)));
    return ", " + amount + (late > 0 ? " late" : " early");
  }

  private List<String> facts() {
    List<String> lines = new ArrayList<>();
    Network reachable = Ways.reachable(network);
    int compressible =
        (int) reachable.activities().stream().filter(Activity::isCompressible).count();
    int waits = (int) network.links().stream().mapToLong(Link::lag).filter(l -> l != 0).count();
    add(
        lines,
        Wording.count(of.toGo(), "activity", "activities")
            + (of.progress().isPresent() ? " to go" : "")
            + String.format(Locale.ROOT, ", %,d can be shortened; ", compressible)
            + Wording.count(network.links().size(), "link", "links")
            + (waits == 0 ? "" : String.format(Locale.ROOT, ", %,d of them with a wait", waits)));
    of.terms().calendar().ifPresent(calendar -> add(lines, workingTime(calendar)));
    add(lines, "No finish is shorter than " + Wording.finish(of, answer.shortest()));
    chains(lines);
    floats(lines);
    list(lines, "Nothing comes before: ", answer.openStarts());
    list(lines, "Nothing comes after: ", answer.openEnds());
    return lines;
  }

  private String workingTime(WorkingCalendar calendar) {
    BigDecimal perDay = network.scale().units(calendar.dayLength().ticks());
    boolean finer = of.unit() == TimeUnit.HOUR || of.unit() == TimeUnit.SHIFT;
    int holidays = calendar.holidaysThatCount();
    return Wording.workingDuration(of, answer.asPlanned().finish())
        + " from "
        + Dates.spoken(
            calendar.dataDate().isEmpty() ? calendar.startDate() : calendar.firstWorkingDay())
        + ", "
        + Dates.weekdays(calendar.weekdays())
        + (finer ? ", " + perDay + " " + Wording.unit(of, perDay) + " a working day" : "")
        + ", "
        + (holidays == 0
            ? "no holidays"
            : Wording.count(holidays, "holiday", "holidays") + " on those days");
  }

  private void chains(List<String> lines) {
    if (answer.chainCount().equals(BigInteger.ONE)) {
      answer.firstChains().forEach(chain -> list(lines, "One chain is critical: ", chain));
      return;
    }
    String count = Wording.grouped(new BigDecimal(answer.chainCount()));
    add(lines, count + " chains are critical" + (answer.firstChains().isEmpty() ? "" : ":"));
    answer.firstChains().forEach(chain -> list(lines, "  ", chain));
    BigInteger more = answer.chainCount().subtract(BigInteger.valueOf(answer.firstChains().size()));
    if (more.signum() > 0 && !answer.firstChains().isEmpty()) {
      lines.add("    and " + Wording.grouped(new BigDecimal(more)) + " more");
    }
  }

  private void floats(List<String> lines) {
    long least = Long.MAX_VALUE;
    long most = 0;
    for (int i = 0; i < network.size(); i++) {
      long slack = of.isToGo(i) ? answer.asPlanned().totalFloat(i) : 0;
      most = Math.max(most, slack);
      least = slack > 0 ? Math.min(least, slack) : least;
    }
    if (most == 0) {
      add(lines, "Every activity is critical");
      return;
    }
    String from = least == most ? "" : Wording.grouped(network.scale().units(least)) + " to ";
    add(lines, "The others have " + from + Wording.duration(of, most) + " of float");
    List<String> near =
        answer.nearCritical().stream()
            .map(i -> id(i) + " " + network.scale().text(answer.asPlanned().totalFloat(i)))
            .toList();
    if (!near.isEmpty()) {
      add(lines, "Least float: " + String.join(", ", near));
    }
  }

  private List<String> notes() {
    List<String> lines = new ArrayList<>();
    List<NeverCritical> all = answer.neverCritical();
    for (NeverCritical never : all.subList(0, Math.min(MOST_NOTES, all.size()))) {
      lines.add("  note  activities.csv crash_duration");
      String first = lines.size() > 1 ? "." : ", and no finish is shorter than ";
      String text =
          Wording.safe(id(never.activity()))
              + " can never become critical: the longest chain through it takes "
              + Wording.duration(of, never.longestThrough())
              + " "
              + Wording.asPlanned(of)
              + first
              + (lines.size() > 1
                  ? ""
                  : network.scale().text(answer.shortest()) + ". Shortening it gains nothing.");
      lines.addAll(Wording.wrap(text, NOTE_INDENT, width));
    }
    if (all.size() > MOST_NOTES) {
      lines.add("  and " + Wording.count(all.size() - MOST_NOTES, "note", "notes") + " more");
    }
    return lines;
  }

  private void list(List<String> lines, String before, List<Integer> activities) {
    String start = Wording.INDENT + before;
    List<String> ids = activities.stream().map(this::id).toList();
    lines.add(start + Wording.ids(ids, width - start.length()));
  }

  private void add(List<String> lines, String text) {
    lines.addAll(Wording.wrap(Wording.safe(text), Wording.INDENT, width));
  }

  private String id(int activity) {
    return network.activity(activity).id();
  }
}
