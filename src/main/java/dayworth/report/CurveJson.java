package dayworth.report;

import dayworth.contract.Due;
import dayworth.decision.CrossCheck;
import dayworth.decision.CurveAnswer;
import dayworth.decision.Finish;
import dayworth.decision.PlanChange;
import dayworth.decision.Status;
import dayworth.decision.StepFacts;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Timing;
import dayworth.value.Money;
import java.io.IOException;
import java.util.Optional;
import java.util.stream.IntStream;

/** The members of a curve's result. */
final class CurveJson {

  private final CurveAnswer answer;
  private final Network network;
  private final Dates dates;
  private final CaseJson names;

  CurveJson(CurveAnswer answer) {
    this.answer = answer;
    this.network = answer.of().network();
    this.dates = new Dates(answer.of());
    this.names = new CaseJson(network);
  }

  void write(JsonText json) throws IOException {
    json.object("as_planned", members -> finish(members, answer.asPlanned()));
    json.array("least", answer.least(), this::finish);
    contractFinish(json);
    json.object("shortest", members -> shortest(members));
    json.object("crash_everything", members -> finish(members, answer.crashEverything()));
    json.array("curve", answer.rows(), this::finish);
    json.array("steps", answer.steps(), this::step);
    json.object("plan", this::plan);
    json.object("crosscheck", this::crossCheck);
    json.object(
        "proof",
        members -> {
          members.number("proved", answer.provedRows());
          members.number("of", answer.rows().size());
          members.array(
              "unproved",
              answer.unproved(),
              (gap, unproved) -> {
                gap.number("duration", names.units(unproved.duration()));
                gap.number("cost", unproved.cost().cents());
                gap.number("bound", unproved.bound().cents());
              });
          members.yesNo("cut_by_effort", answer.isCut());
        });
    json.object("evidence", members -> new EvidenceJson(answer).write(members));
  }

  void finish(JsonText json, Finish finish) throws IOException {
    json.number("duration", names.units(finish.duration()));
    if (dates.areKnown()) {
      json.text("finish_date", dates.finish(finish.duration()));
    }
    json.number("direct_cost", finish.direct().cents());
    json.number("running_cost", finish.running().cents());
    json.number("time_related_cost", finish.other().timeRelated().cents());
    json.number("fixed_cost", finish.other().fixed().cents());
    json.number("damages", finish.other().damages().cents());
    json.number("bonus", finish.other().bonus().cents());
    json.number("total_cost", finish.total());
    if (finish.pricePerUnit().isPresent()) {
      json.number("price_per_unit", finish.pricePerUnit().get().cents());
    } else {
      json.nothing("price_per_unit");
    }
    json.yesNo("breakpoint", finish.breakpoint());
  }

  private void contractFinish(JsonText json) throws IOException {
    Optional<Due> due = answer.of().terms().contractFinish();
    if (due.isEmpty()) {
      json.nothing("contract_finish");
      return;
    }
    json.object(
        "contract_finish",
        members -> {
          members.number("due", names.units(due.get().ticks()));
          if (due.get().date().isPresent()) {
            members.text("due_date", due.get().date().get().toString());
          }
          members.yesNo("can_be_met", answer.atContract().isPresent());
          if (answer.atContract().isPresent()) {
            Finish met = answer.atContract().get();
            members.object("cheapest", inner -> finish(inner, met));
          } else {
            members.nothing("cheapest");
          }
        });
  }

  private void shortest(JsonText json) throws IOException {
    finish(json, answer.shortest());
    json.array(
        "stopped_by",
        answer.curve().obstacles(),
        (members, obstacle) -> new ObstacleJson(network).write(members, obstacle));
  }

  private void step(JsonText json, StepFacts facts) throws IOException {
    json.number("from_duration", names.units(facts.step().from()));
    json.number("to_duration", names.units(facts.step().to()));
    json.number("price_per_unit", perUnit(facts.step().pricePerTick()).cents());
    json.number("extra_cost", facts.step().extra().cents());
    json.array("changes", facts.changes(), this::change);
    json.number("critical_activities", facts.criticalAfter());
    json.texts("newly_critical", names.ids(facts.newlyCritical()));
  }

  private void change(JsonText json, PlanChange change) throws IOException {
    json.text("activity", names.id(change.activity()));
    json.text("change", StepsTable.word(change));
    json.text("measure", MeasureNames.of(network, change.measure()));
    json.number("units", names.units(Math.abs(change.shortened())));
    if (change.pricePerTick().isPresent()) {
      json.number("slope", perUnit(change.pricePerTick().get()).cents());
    } else {
      json.nothing("slope");
    }
  }

  private Money perUnit(Money perTick) {
    return perTick.times(network.scale().ticksPerUnit());
  }

  private void plan(JsonText json) throws IOException {
    json.number("duration", names.units(answer.asked().finish().duration()));
    Iterable<Integer> all = IntStream.range(0, network.size()).boxed().toList();
    json.array("activities", all, this::activity);
  }

  private void activity(JsonText json, int index) throws IOException {
    Timing timing = answer.asked().timing();
    Activity activity = network.activity(index);
    long duration = timing.plan().duration(index);
    json.text("id", activity.id());
    json.text("name", activity.name());
    json.number("duration", names.units(duration));
    json.text("measure", MeasureNames.of(network, timing.plan().measure(index)));
    json.number("units_compressed", names.units(activity.normal() - duration));
    json.number("extra_cost", PlanTable.extraCost(network, timing.plan(), index).cents());
    Status status = answer.of().status(index);
    if (dates.areKnown()) {
      long start = timing.start(index);
      json.text("start_date", dates.start(status, start, timing.finish(index)));
      json.text("finish_date", dates.finish(status, timing.finish(index)));
    }
    if (!status.isFinished()) {
      times(json, timing, index);
    }
    json.yesNo("critical", answer.of().isCritical(timing, index));
  }

  private void times(JsonText json, Timing timing, int index) throws IOException {
    json.number("early_start", names.units(timing.earlyStart(index)));
    json.number("early_finish", names.units(timing.earlyFinish(index)));
    json.number("late_start", names.units(timing.lateStart(index)));
    json.number("late_finish", names.units(timing.lateFinish(index)));
    json.number("total_float", names.units(timing.totalFloat(index)));
    json.number("free_float", names.units(timing.freeFloat(index)));
  }

  private void crossCheck(JsonText json) throws IOException {
    CrossCheck crossCheck = answer.crossCheck();
    json.number("at_breakpoints", crossCheck.atBreakpoints());
    json.number("between", crossCheck.between());
    json.number("of_points", crossCheck.ofPoints());
    json.number("largest_difference", crossCheck.largestDifference());
    json.array(
        "points",
        crossCheck.comparisons(),
        (members, point) -> {
          members.number("duration", names.units(point.duration()));
          members.number("stepping_cost", point.stepping().cents());
          members.number("lp_cost", point.linear());
          members.number("difference", point.difference());
        });
    json.array(
        "unanswered",
        crossCheck.unanswered(),
        (members, point) -> {
          members.number("duration", names.units(point.duration()));
          members.text("reason", point.reason());
        });
  }
}
