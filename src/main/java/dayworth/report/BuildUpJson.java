package dayworth.report;

import dayworth.buildup.ActivityBuildUp;
import dayworth.buildup.BuildUp;
import dayworth.buildup.ExtraCost;
import dayworth.buildup.Pattern;
import dayworth.buildup.PayLadder;
import dayworth.buildup.Spell;
import dayworth.buildup.Way;
import dayworth.decision.BuildUpAnswer;
import dayworth.value.Money;
import dayworth.value.Quantity;
import java.io.IOException;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;

/** The members of a build-up's result. */
final class BuildUpJson {

  private final BuildUpAnswer answer;
  private final CaseJson names;

  BuildUpJson(BuildUpAnswer answer) {
    this.answer = answer;
    this.names = new CaseJson(answer.of().network());
  }

  void write(JsonText json) throws IOException {
    json.array("patterns", answer.all().patterns(), this::pattern);
    json.array("activities", answer.all().activities(), this::activity);
    json.text("who_decides", CautionText.WHO_DECIDES);
  }

  private void pattern(JsonText json, Pattern pattern) throws IOException {
    json.text("pattern", pattern.name());
    number(json, "hours_per_week", pattern.hoursPerWeek());
    number(json, "days_per_week", pattern.daysPerWeek());
    number(json, "crew_factor", pattern.crewFactor());
    number(json, "crowding_loss", pattern.crowdingLoss());
    money(json, "once_cost", pattern.onceCost());
    money(json, "week_cost", pattern.weekCost());
    if (pattern.weeksMax().isPresent()) {
      json.number("weeks_max", pattern.weeksMax().getAsInt());
    } else {
      json.nothing("weeks_max");
    }
    json.text("note", pattern.note());
    json.array("pay", pattern.pay().steps(), BuildUpJson::step);
    json.array(
        "losses",
        IntStream.range(0, pattern.loss().weeks().size()).boxed().toList(),
        (members, i) -> {
          members.number("week", i + 1);
          number(members, "loss", pattern.loss().weeks().get(i).loss());
          members.text("source", pattern.loss().weeks().get(i).source());
        });
    json.array(
        "cautions",
        answer.cautions(pattern),
        (members, caution) -> {
          members.text("caution", caution.name().toLowerCase(Locale.ROOT));
          members.text("text", CautionText.of(caution, pattern));
        });
  }

  private static void step(JsonText json, PayLadder.Step step) throws IOException {
    number(json, "above_hours", step.aboveHours());
    number(json, "multiplier", step.multiplier());
  }

  private void activity(JsonText json, ActivityBuildUp built) throws IOException {
    json.text("activity", names.id(built.activity()));
    json.yesNo("of_remaining", built.ofRemaining());
    number(json, "labour_hours", built.labour().hours());
    number(json, "crew", built.labour().crew());
    money(json, "rate", built.labour().rate());
    money(json, "other_cost", built.labour().otherCost());
    json.number("normal_duration", BuildUp.SCALE.units(built.normal()));
    money(json, "normal_cost", built.normalCost());
    json.array("ways", built.ways(), (members, way) -> way(members, built, way));
  }

  private static void way(JsonText json, ActivityBuildUp built, Way way) throws IOException {
    WayFigures figures = new WayFigures(built, way);
    Spell spell = way.spell();
    json.text("measure", way.name());
    json.text("pattern", spell.pattern().name());
    json.number("weeks", spell.roundedWeeks());
    number(json, "weeks_after", spell.weeksAfter());
    json.number("duration", figures.duration());
    json.number("saved", figures.saved());
    number(json, "hours_worked", spell.hoursWorked());
    number(json, "hours_lost", spell.hoursLost());
    number(json, "hours_crowded", spell.hoursCrowded());
    money(json, "pay", spell.pay());
    extra(json, spell.extra());
    money(json, "cost", way.cost());
    Optional<Money> price = figures.perUnitSaved();
    if (price.isPresent()) {
      money(json, "extra_per_unit_saved", price.get());
    } else {
      json.nothing("extra_per_unit_saved");
    }
    json.text("verdict", figures.verdict());
    if (figures.dominator().isPresent()) {
      json.text("dominated_by", figures.dominator().get());
    }
    json.texts("loss_sources", spell.lossSources());
  }

  /** The lines of what a spell costs more, and their sum. */
  static void extra(JsonText json, ExtraCost extra) throws IOException {
    money(json, "premium", extra.premium());
    money(json, "lost_output", extra.lostOutput());
    money(json, "extra_hours", extra.extraHours());
    money(json, "supervision", extra.supervision());
    money(json, "once_cost", extra.once());
    money(json, "extra_cost", extra.total());
  }

  private static void number(JsonText json, String name, Quantity number) throws IOException {
    json.number(name, WayFigures.number(number));
  }

  private static void money(JsonText json, String name, Money amount) throws IOException {
    json.number(name, amount.cents());
  }
}
