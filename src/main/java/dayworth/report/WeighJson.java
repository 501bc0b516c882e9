package dayworth.report;

import dayworth.decision.BestByLoss;
import dayworth.decision.BestByRate;
import dayworth.decision.Case;
import dayworth.decision.Choice;
import dayworth.decision.Finish;
import dayworth.decision.LossSweep;
import dayworth.decision.WeighAnswer;
import dayworth.decision.Weighing;
import dayworth.value.Money;
import java.io.IOException;
import java.math.RoundingMode;
import java.util.Optional;

/** The members of a weighing's result. */
final class WeighJson {

  /** Ends of ranges are fractions; so many decimals tell more than any contract does. */
  private static final int RATE_DECIMALS = 6;

  private final WeighAnswer answer;
  private final CaseJson names;
  private final Dates dates;

  WeighJson(WeighAnswer answer) {
    this.answer = answer;
    this.names = new CaseJson(answer.of().network());
    this.dates = new Dates(answer.of());
  }

  void write(JsonText json) throws IOException {
    if (answer.byLoss().isPresent()) {
      json.object("by_loss_factor", members -> byLoss(members, answer.byLoss().get()));
    }
    json.object("without_extension", members -> weighing(members, answer.granted()));
    if (answer.claimed().isPresent()) {
      json.object("with_extension", members -> weighing(members, answer.claimed().get()));
      json.array(
          "best_by_extension",
          answer.byExtension(),
          (members, extension) -> {
            members.number("from_working_days", (int) extension.from());
            if (extension.to().isPresent()) {
              members.number("to_working_days", extension.to().get().intValue());
            } else {
              members.nothing("to_working_days");
            }
            finish(members, extension.best());
          });
    }
  }

  private void byLoss(JsonText json, BestByLoss best) throws IOException {
    json.number("now", WayFigures.number(best.now()));
    json.number("sought_to", WayFigures.number(LossSweep.STEP));
    json.yesNo("all_sought_so_far", best.isNarrowed());
    json.yesNo("no_output_beyond", best.isBounded());
    json.array(
        "ranges",
        best.ranges(),
        (members, range) -> {
          members.number("from", WayFigures.number(range.from().factor()));
          members.number("to", WayFigures.number(range.to().factor()));
          best(members, range.from());
        });
    json.array("tried", best.tried(), this::tried);
  }

  /** In the time scale of its own case, which the losses may make finer. */
  private static void best(JsonText json, BestByLoss.Tried tried) throws IOException {
    Case of = tried.curve().of();
    json.number("duration", of.network().scale().units(tried.best().duration()));
    if (of.terms().calendar().isPresent()) {
      json.text("finish_date", new Dates(of).finish(tried.best().duration()));
    }
  }

  private void tried(JsonText json, BestByLoss.Tried tried) throws IOException {
    json.number("loss_factor", WayFigures.number(tried.factor()));
    new CurveJson(tried.curve()).finish(json, tried.best());
    json.number("saved_against_as_it_stands", tried.saved());
    json.yesNo("proved", tried.curve().provedRows() == tried.curve().rows().size());
  }

  private void weighing(JsonText json, Weighing weighing) throws IOException {
    json.array(
        "choices", weighing.choices(), (members, choice) -> choice(members, weighing, choice));
    if (weighing.byDamages().isPresent()) {
      json.object("by_damages_rate", members -> ranges(members, weighing.byDamages().get()));
    } else {
      json.nothing("by_damages_rate");
    }
    json.object("by_time_related_cost", members -> ranges(members, weighing.byTimeRelated()));
    json.object("by_cost_of_shortening", members -> ranges(members, weighing.byCompression()));
    json.array(
        "wrong_damages_rates",
        weighing.wrongRates(),
        (members, wrong) -> {
          rate(members, "rate", Optional.of(wrong.rate()));
          finish(members, wrong.best());
          members.number("too_much", wrong.tooMuch().cents());
        });
    json.object(
        "proof",
        members -> {
          members.number("proved", weighing.curve().provedRows());
          members.number("of", weighing.curve().rows().size());
        });
  }

  private void choice(JsonText json, Weighing weighing, Choice choice) throws IOException {
    json.text("choice", WeighTable.name(choice));
    new CurveJson(weighing.curve()).finish(json, choice.finish());
    json.number("saved_against_as_it_stands", weighing.saved(choice.finish()));
  }

  private void ranges(JsonText json, BestByRate best) throws IOException {
    rate(json, "now", Optional.of(best.now()));
    json.array(
        "ranges",
        best.ranges(),
        (members, range) -> {
          rate(members, "from", Optional.of(range.from()));
          rate(members, "to", range.to());
          finish(members, range.finish());
          members.yesNo("damages_at_cap", range.isCapped());
        });
  }

  private static void rate(JsonText json, String name, Optional<Money> rate) throws IOException {
    if (rate.isPresent()) {
      json.number(name, rate.get().rounded(RATE_DECIMALS, RoundingMode.HALF_UP));
    } else {
      json.nothing(name);
    }
  }

  private void finish(JsonText json, Finish finish) throws IOException {
    json.number("duration", names.units(finish.duration()));
    if (dates.areKnown()) {
      json.text("finish_date", dates.finish(finish.duration()));
    }
  }
}
