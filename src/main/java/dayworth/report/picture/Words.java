package dayworth.report.picture;

import dayworth.decision.Case;
import dayworth.decision.Progress;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;

/** How figures are said in pictures: grouped, with their unit or currency. */
final class Words {

  private static final BigDecimal SMALL = BigDecimal.valueOf(1000);

  private final String currency;
  private final String unit;
  private static final DateTimeFormatter DATE =
      DateTimeFormatter.ofPattern("EEE d MMM uuuu", Locale.ENGLISH);

  private final TimeScale scale;
  private final Optional<WorkingCalendar> calendar;
  private final String project;
  private final String asPlanned;

  Words(Case of) {
    this.currency = safe(of.currency());
    this.unit = of.unit().word();
    this.scale = of.network().scale();
    this.calendar = of.terms().calendar();
    String title = safe(of.title());
    String name = title.isEmpty() ? safe(of.name()) : title;
    this.project = withoutStop(name) + of.progress().map(Words::toGo).orElse("");
    this.asPlanned = of.progress().isPresent() ? "as it stands" : "as planned";
  }

  /**
   * Text from a file as one line that can stand in XML: without control characters, marks that turn
   * the direction of reading, and what is no character at all.
   */
  static String safe(String text) {
    StringBuilder safe = new StringBuilder();
    text.codePoints().map(Words::orBlank).forEach(safe::appendCodePoint);
    return safe.toString().strip();
  }

  private static int orBlank(int character) {
    boolean stays =
        switch (Character.getType(character)) {
          case Character.CONTROL,
              Character.SURROGATE,
              Character.UNASSIGNED,
              Character.PRIVATE_USE,
              Character.LINE_SEPARATOR,
              Character.PARAGRAPH_SEPARATOR ->
              false;
          // The joiners shape letters; everything else of this kind is there to mislead.
          case Character.FORMAT -> character == 0x200C || character == 0x200D;
          default -> true;
        };
    return stays ? character : ' ';
  }

  /** What the case is called, without a full stop at its end. */
  String project() {
    return project;
  }

  private static String withoutStop(String name) {
    return name.endsWith(".") ? name.substring(0, name.length() - 1) : name;
  }

  private static String toGo(Progress progress) {
    return ", work to go after " + progress.dataDate();
  }

  /** The plan with every activity its normal way. */
  String asPlanned() {
    return asPlanned;
  }

  /** An amount without its currency: whole, but with cents where it is small and has them. */
  String amount(BigDecimal amount) {
    boolean cents = amount.abs().compareTo(SMALL) < 0 && amount.stripTrailingZeros().scale() > 0;
    BigDecimal rounded = amount.setScale(cents ? 2 : 0, RoundingMode.HALF_UP);
    String figures = grouped(cents ? "#,##0.00" : "#,##0", rounded.abs());
    return rounded.signum() < 0 ? "−" + figures : figures;
  }

  /** An amount with its currency. */
  String money(BigDecimal amount) {
    if (currency.isEmpty()) {
      return amount(amount);
    }
    boolean symbol = currency.codePointCount(0, currency.length()) == 1;
    return symbol ? currency + amount(amount) : currency + " " + amount(amount);
  }

  /** What amounts without a currency are in, as a sentence; empty if the case does not say. */
  String amountsIn() {
    return currency.isEmpty() ? "" : " Amounts in " + currency + ".";
  }

  /** A duration without its unit. */
  String figure(long ticks) {
    return grouped("#,##0.###", scale.units(ticks));
  }

  /** The date of a finish; empty in a case without dates. */
  Optional<String> date(long ticks) {
    return calendar.map(dates -> DATE.format(dates.finishDate(ticks)));
  }

  /** A duration with its unit. */
  String time(long ticks) {
    return figure(ticks) + " " + (ticks == scale.ticksPerUnit() ? one() : many());
  }

  /** One unit of time: the word for the axis. */
  String one() {
    return unit.equals("day") ? "working day" : unit;
  }

  String many() {
    return one() + "s";
  }

  /** The short word for one unit of time. */
  String unit() {
    return unit;
  }

  /** One of it with its article. */
  String aUnit() {
    return (unit.startsWith("h") ? "an " : "a ") + unit;
  }

  String units() {
    return unit + "s";
  }

  static String count(int count, String one, String many) {
    return grouped("#,##0", BigDecimal.valueOf(count)) + " " + (count == 1 ? one : many);
  }

  private static String grouped(String pattern, BigDecimal figure) {
    return new DecimalFormat(pattern, DecimalFormatSymbols.getInstance(Locale.ROOT)).format(figure);
  }
}
