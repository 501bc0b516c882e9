package dayworth.report;

import dayworth.buildup.BuildUp;
import dayworth.buildup.Caution;
import dayworth.buildup.ExtraCost;
import dayworth.buildup.OutputLoss;
import dayworth.buildup.Pattern;
import dayworth.buildup.Spell;
import dayworth.decision.Case;
import dayworth.network.Measure;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

/** Why measures that are built up from labour hours cost what they cost, and what to beware of. */
final class SpellReasons {

  private static final int MOST = 12;

  /** A measure that stands for a spell. */
  private record Used(String id, String name, Spell spell, boolean ofRemaining) {}

  private final Case of;
  private final List<Used> used = new ArrayList<>();

  /**
   * For some measures of a case.
   *
   * @param measures by their index; those that are not built up are passed over
   */
  SpellReasons(Case of, List<Integer> measures) {
    this.of = of;
    for (int index : measures) {
      Measure measure = of.network().measures().get(index);
      String id = Wording.safe(of.network().activity(measure.activity()).id());
      of.buildUp()
          .spell(measure.activity(), measure.name())
          .map(way -> new Used(id, Wording.safe(way.name()), way.spell(), measure.ofRemaining()))
          .ifPresent(used::add);
    }
  }

  boolean isEmpty() {
    return used.isEmpty();
  }

  /** A sentence for each measure: its sum, the hours, what is lost and who says so. */
  List<String> sentences() {
    List<String> sentences = new ArrayList<>();
    used.stream().limit(MOST).map(SpellReasons::sentence).forEach(sentences::add);
    if (used.size() > MOST) {
      sentences.add(
          "For "
              + Wording.count(used.size() - MOST, "more spell", "more spells")
              + " see dayworth buildup.");
    }
    return sentences;
  }

  private static String sentence(Used each) {
    ExtraCost extra = each.spell().extra();
    Map<String, Money> lines = parts(extra);
    List<BigDecimal> amounts = new ArrayList<>(List.of(extra.total().cents()));
    lines.values().forEach(amount -> amounts.add(amount.cents()));
    MoneyLook look = MoneyLook.of(amounts);
    String sum =
        lines.entrySet().stream()
            .map(line -> look.text(line.getValue().cents()) + " " + line.getKey())
            .collect(Collectors.joining(" + "));
    return each.id()
        + ", "
        + each.name()
        + (each.ofRemaining() ? " of what is left" : "")
        + ": "
        + look.text(extra.total().cents())
        + " more than at the normal pattern"
        + (sum.isEmpty() ? "" : " = " + sum)
        + ". "
        + hours(each.spell())
        + loss(each.spell());
  }

  /** The lines of the sum in words; those that are nothing are left out. */
  private static Map<String, Money> parts(ExtraCost extra) {
    Map<String, Money> parts = new LinkedHashMap<>();
    parts.put("premium pay", extra.premium());
    parts.put("lost output", extra.lostOutput());
    parts.put("extra hours of the crowded crew", extra.extraHours());
    parts.put("supervision by the week", extra.supervision());
    parts.put("paid once", extra.once());
    parts.values().removeIf(Money::isZero);
    return parts;
  }

  private static String hours(Spell spell) {
    return tenths(spell.hoursWorked())
        + " hours are worked for "
        + tenths(spell.output())
        + " hours of output";
  }

  private static String loss(Spell spell) {
    OutputLoss loss = spell.pattern().loss();
    if (loss.weeks().isEmpty()) {
      return "; no loss of output is given for " + Wording.safe(spell.pattern().name()) + ".";
    }
    int weeks = spell.weeks().rounded(0, RoundingMode.CEILING).intValueExact();
    String first = LossText.percent(loss, 1);
    String last = LossText.percent(loss, weeks);
    return "; loss of output "
        + (first.equals(last) ? first : first + " in week 1 to " + last + " in week " + weeks)
        + ", source: "
        + LossText.source(loss, weeks)
        + ".";
  }

  private static String tenths(Quantity hours) {
    return Wording.grouped(hours.rounded(1, RoundingMode.HALF_UP));
  }

  /**
   * What the patterns in use ask care for, at their longest spells here, and whose decision it is.
   */
  List<String> cautions() {
    Map<Pattern, Quantity> longest = new LinkedHashMap<>();
    used.forEach(
        each -> longest.merge(each.spell().pattern(), each.spell().weeks(), Quantity::max));
    BuildUp all = of.buildUp();
    List<String> texts = new ArrayList<>();
    longest.forEach(
        (pattern, weeks) ->
            CautionText.of(pattern, Caution.of(pattern, all.patterns().get(0), weeks))
                .ifPresent(texts::add));
    if (!texts.isEmpty()) {
      texts.add(CautionText.WHO_DECIDES);
    }
    return texts;
  }

  /** Where what is lost at the patterns in use is known from. */
  List<String> losses() {
    return LossText.of(used.stream().map(each -> each.spell().pattern()).distinct().toList());
  }

  /** A line for each measure: every part of its sum, whole; the build-up has the cents. */
  List<String> table(int width) {
    List<Used> shown = used.subList(0, Math.min(MOST, used.size()));
    TextColumns columns = new TextColumns(width);
    columns.add("", false, shown.stream().map(Used::id).toList());
    columns.add("", false, shown.stream().map(Used::name).toList());
    columns.add("extra", true, amounts(shown, ExtraCost::total));
    columns.add("premium", true, amounts(shown, ExtraCost::premium));
    columns.add("lost output", true, amounts(shown, ExtraCost::lostOutput));
    columns.add("extra hours", true, amounts(shown, ExtraCost::extraHours));
    columns.add("weekly", true, amounts(shown, ExtraCost::supervision));
    columns.add("once", true, amounts(shown, ExtraCost::once));
    return columns.lines();
  }

  private static List<String> amounts(List<Used> shown, Function<ExtraCost, Money> part) {
    MoneyLook whole = new MoneyLook(0);
    return shown.stream()
        .map(each -> whole.text(part.apply(each.spell().extra()).cents()))
        .toList();
  }
}
