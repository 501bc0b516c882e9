package dayworth.report.brief;

import dayworth.contract.Due;
import dayworth.contract.Per;
import dayworth.decision.BriefAnswer;
import dayworth.decision.Case;
import dayworth.decision.Finish;
import dayworth.decision.TimeUnit;
import dayworth.network.Activity;
import dayworth.value.Money;
import dayworth.value.Quantity;
import dayworth.value.TimeScale;
import dayworth.value.WorkingCalendar;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;

/** How the brief says figures, dates and names. */
final class Words {

  private static final Map<String, String> SYMBOLS =
      Map.of("EUR", "€", "GBP", "£", "JPY", "¥", "INR", "₹");

  private static final List<String> NUMBERS =
      List.of(
          "no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten",
          "eleven", "twelve");

  private static final DateTimeFormatter LONG = format("EEEE d MMMM uuuu");
  private static final DateTimeFormatter LONG_PLAIN = format("EEEE d MMMM");
  private static final DateTimeFormatter SHORT = format("EEE d MMM");
  private static final DateTimeFormatter SHORT_YEAR = format("EEE d MMM uuuu");
  private static final DateTimeFormatter DAY_MONTH = format("d MMM");
  private static final DateTimeFormatter MONTH = format("MMM");

  /** Within so many months a day and a month are one date. */
  private static final int PLAIN_MONTHS = 10;

  private static final int ID_ROOM = 24;

  private final Case of;
  private final TimeScale scale;
  private final Optional<WorkingCalendar> calendar;
  private final String currency;
  private final int decimals;

  /** Up to when a day and a month are one date; empty where they are not. */
  private final Optional<LocalDate> plainUntil;

  Words(BriefAnswer answer) {
    this.of = answer.of();
    this.scale = of.network().scale();
    this.calendar = of.terms().calendar();
    this.currency = SYMBOLS.getOrDefault(of.currency(), safe(of.currency()));
    boolean whole = named(answer).flatMap(Words::amounts).allMatch(Words::isWhole);
    this.decimals = whole ? 0 : 2;
    long latest =
        Math.max(answer.curve().asPlanned().duration(), answer.states().get(0).finish().duration());
    this.plainUntil =
        calendar
            .filter(
                dates ->
                    dates.finishDate(latest).isBefore(dates.startDate(0).plusMonths(PLAIN_MONTHS)))
            .map(dates -> dates.finishDate(latest));
  }

  private static DateTimeFormatter format(String pattern) {
    return DateTimeFormatter.ofPattern(pattern, Locale.ENGLISH);
  }

  /** The finishes that are spoken of; whether they have cents says how all amounts look. */
  private static Stream<Finish> named(BriefAnswer answer) {
    return Stream.concat(
        Stream.of(
            answer.finish(),
            answer.curve().asPlanned(),
            answer.curve().leastTotal(),
            answer.curve().shortest()),
        answer.curve().atContract().stream());
  }

  private static Stream<BigDecimal> amounts(Finish finish) {
    return Stream.of(
            finish.direct(),
            finish.running(),
            finish.other().timeRelated(),
            finish.other().fixed(),
            finish.other().damages(),
            finish.other().bonus())
        .map(Money::cents);
  }

  private static boolean isWhole(BigDecimal amount) {
    return amount.stripTrailingZeros().scale() <= 0;
  }

  // Money

  /** An amount with its currency; cents where it or a finish that is spoken of has them. */
  String money(BigDecimal amount) {
    String figures = amount(amount.abs());
    boolean symbol = currency.codePointCount(0, currency.length()) == 1;
    String text =
        currency.isEmpty() ? figures : symbol ? currency + figures : currency + "\u00a0" + figures;
    return amount.signum() < 0 ? "−" + text : text;
  }

  /** A round amount on a scale, without cents. */
  String round(BigDecimal amount) {
    String text = money(amount);
    return text.endsWith(".00") ? text.substring(0, text.length() - 3) : text;
  }

  String money(Money amount) {
    return money(amount.cents());
  }

  /** An amount without its currency. */
  String amount(BigDecimal amount) {
    BigDecimal cents = amount.setScale(2, RoundingMode.HALF_UP);
    return grouped(cents.setScale(isWhole(cents) ? decimals : 2, RoundingMode.UNNECESSARY));
  }

  String amount(Money amount) {
    return amount(amount.cents());
  }

  /** What all amounts are in, for a caption; empty if the case does not say. */
  String currencyName() {
    return of.currency().equals("EUR") ? "euros" : safe(of.currency());
  }

  static String grouped(BigDecimal number) {
    String text = String.format(Locale.ROOT, "%,." + Math.max(0, number.scale()) + "f", number);
    return text.startsWith("-") ? "−" + text.substring(1) : text;
  }

  /** Hours, weeks and shares, with as many decimals as they need, at most three. */
  static String decimals(Quantity quantity) {
    BigDecimal rounded = quantity.rounded(3, RoundingMode.HALF_UP).stripTrailingZeros();
    return grouped(rounded.scale() < 0 ? rounded.setScale(0) : rounded);
  }

  /** What a rate is for one of. */
  String one(Per per) {
    return switch (per) {
      case UNIT -> "a " + workingUnit();
      case CALENDAR_DAY -> "a calendar day";
      case WEEK -> "a calendar week";
    };
  }

  // Time

  /** A duration without its unit. */
  String figure(long ticks) {
    return grouped(scale.units(ticks));
  }

  /** {@code 55 days}. */
  String time(long ticks) {
    return figure(ticks) + " " + (isOne(ticks) ? unit() : units());
  }

  /** {@code 55 working days}. */
  String workingTime(long ticks) {
    return figure(ticks) + " " + (isOne(ticks) ? workingUnit() : workingUnits());
  }

  /** {@code eight working days}, small whole ones as words. */
  String workingTimeInWords(long ticks) {
    return number(ticks) + " " + (isOne(ticks) ? workingUnit() : workingUnits());
  }

  /** {@code eight days}. */
  String timeInWords(long ticks) {
    return number(ticks) + " " + (isOne(ticks) ? unit() : units());
  }

  private String number(long ticks) {
    BigDecimal units = scale.units(ticks);
    return units.scale() == 0 && units.compareTo(BigDecimal.valueOf(NUMBERS.size())) < 0
        ? number(units.intValueExact())
        : grouped(units);
  }

  /** A count, small ones as words. */
  static String number(int count) {
    return count > 0 && count < NUMBERS.size()
        ? NUMBERS.get(count)
        : grouped(BigDecimal.valueOf(count));
  }

  /** {@code four activities}. */
  static String count(int count, String one, String many) {
    return number(count) + " " + (count == 1 ? one : many);
  }

  private boolean isOne(long ticks) {
    return ticks == scale.ticksPerUnit();
  }

  /** The short word for one unit of time. */
  String unit() {
    return of.unit().word();
  }

  String units() {
    return unit() + "s";
  }

  String aUnit() {
    return (unit().equals("hour") ? "an " : "a ") + unit();
  }

  /** {@code A day}. */
  String capitalUnit() {
    return capital(aUnit());
  }

  /** A working day is told from a calendar day. */
  String workingUnit() {
    return of.unit() == TimeUnit.DAY ? "working day" : unit();
  }

  String workingUnits() {
    return workingUnit() + "s";
  }

  long ticksPerUnit() {
    return scale.ticksPerUnit();
  }

  // Dates

  boolean hasDates() {
    return calendar.isPresent();
  }

  Optional<WorkingCalendar> calendar() {
    return calendar;
  }

  /** {@code Friday 20 November 2026}. */
  static String longDate(LocalDate date) {
    return LONG.format(date);
  }

  /** {@code Fri 20 Nov}, with the year where it could be another. */
  String shortDate(LocalDate date) {
    return noBreaks((isPlain(date) ? SHORT : SHORT_YEAR).format(date));
  }

  private boolean isPlain(LocalDate date) {
    return plainUntil.filter(last -> !date.isAfter(last)).isPresent();
  }

  static String dayMonth(LocalDate date) {
    return noBreaks(DAY_MONTH.format(date));
  }

  static String month(LocalDate date) {
    return MONTH.format(date);
  }

  private static String noBreaks(String text) {
    return text.replace(' ', '\u00a0');
  }

  Optional<LocalDate> date(long ticks) {
    return calendar.map(dates -> dates.finishDate(ticks));
  }

  /** A finish as its date, or as its duration in a case without dates. */
  String finish(long ticks) {
    return date(ticks).map(this::shortDate).orElseGet(() -> time(ticks));
  }

  /** The same in full. */
  String longFinish(long ticks) {
    return date(ticks)
        .map(date -> longDate(date) + afterHours(ticks))
        .orElseGet(() -> workingTime(ticks));
  }

  /** Where a day has several units a date alone does not say when. */
  private String afterHours(long ticks) {
    boolean finer = of.unit() == TimeUnit.HOUR || of.unit() == TimeUnit.SHIFT;
    return finer ? ", after " + time(ticks) : "";
  }

  /** The same in full, without the year. */
  String plainFinish(long ticks) {
    return date(ticks)
        .map(date -> isPlain(date) ? LONG_PLAIN.format(date) : LONG.format(date))
        .orElseGet(() -> workingTime(ticks));
  }

  /** The finish with {@code on} or {@code in} before it. */
  String onFinish(long ticks) {
    return (hasDates() ? "on " : "in ") + longFinish(ticks);
  }

  /** {@code 55 days, Fri 20 Nov}; without dates the duration alone. */
  String both(long ticks) {
    return date(ticks).map(date -> time(ticks) + ", " + shortDate(date)).orElse(time(ticks));
  }

  /** When something is due. */
  String due(Due due) {
    return due.date()
        .map(date -> longDate(date) + afterHours(due.ticks()))
        .orElseGet(() -> workingTime(due.ticks()));
  }

  String shortDue(Due due) {
    return due.date().map(this::shortDate).orElseGet(() -> time(due.ticks()));
  }

  // Names

  /** What the case is called, without a full stop at its end. */
  String project() {
    String title = safe(of.title());
    String name = title.isEmpty() ? safe(of.name()) : title;
    return name.endsWith(".") ? name.substring(0, name.length() - 1) : name;
  }

  String id(int activity) {
    return id(of.network().activity(activity));
  }

  static String id(Activity activity) {
    return safe(activity.id());
  }

  /** An id where there is little room. */
  static String shortId(Activity activity) {
    String id = id(activity);
    return id.length() <= ID_ROOM ? id : id.substring(0, ID_ROOM - 1) + "…";
  }

  static String name(Activity activity) {
    return safe(activity.name());
  }

  /** The plan with every activity its normal way, as a sentence calls it. */
  String presentPlan() {
    return of.progress().isPresent() ? "the plan as it stands" : "the present plan";
  }

  String asPlanned() {
    return of.progress().isPresent() ? "As it stands" : "As planned";
  }

  /** Things side by side as a sentence lists them; of many the first. */
  static String list(List<String> things, int most) {
    int shown = things.size() <= most ? things.size() : most - 1;
    StringBuilder list = new StringBuilder();
    for (int i = 0; i < shown; i++) {
      boolean last = i == things.size() - 1;
      list.append(i == 0 ? "" : last ? " and " : ", ").append(things.get(i));
    }
    int left = things.size() - shown;
    return left == 0 ? list.toString() : list + " and " + number(left) + " more";
  }

  static <T> String list(List<T> things, int most, Function<T, String> name) {
    return list(things.stream().map(name).toList(), most);
  }

  static String capital(String sentence) {
    return sentence.isEmpty()
        ? sentence
        : sentence.substring(0, 1).toUpperCase(Locale.ROOT) + sentence.substring(1);
  }

  /**
   * Text from a case as one line: without control characters and marks that turn the direction of
   * reading. What reads from right to left is set apart, so that it turns nothing beside it.
   */
  static String safe(String text) {
    StringBuilder safe = new StringBuilder();
    boolean[] turns = new boolean[1];
    text.codePoints()
        .forEach(
            c -> {
              safe.appendCodePoint(stays(c) ? c : ' ');
              byte direction = Character.getDirectionality(c);
              turns[0] |=
                  direction == Character.DIRECTIONALITY_RIGHT_TO_LEFT
                      || direction == Character.DIRECTIONALITY_RIGHT_TO_LEFT_ARABIC;
            });
    String line = safe.toString().strip().replaceAll(" {2,}", " ");
    return turns[0] ? "\u2068" + line + "\u2069" : line;
  }

  private static boolean stays(int character) {
    return switch (Character.getType(character)) {
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
  }
}
