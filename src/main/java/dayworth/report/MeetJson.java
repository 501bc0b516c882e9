package dayworth.report;

import dayworth.buildup.Spell;
import dayworth.buildup.Way;
import dayworth.decision.MeetAnswer;
import dayworth.decision.PlanProof;
import dayworth.decision.Wish;
import dayworth.engine.proof.ProofSheet;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.Optional;
import java.util.stream.IntStream;

/** What a result of {@code dayworth meet} has beyond that of a curve. */
final class MeetJson {

  private final MeetAnswer answer;
  private final Network network;
  private final CaseJson names;

  MeetJson(MeetAnswer answer) {
    this.answer = answer;
    this.network = answer.of().network();
    this.names = new CaseJson(network);
  }

  void write(JsonText json) throws IOException {
    json.object("asked", this::asked);
    json.object("met", this::met);
    json.object("proof_sheet", this::proof);
    EvidenceJson evidence = new EvidenceJson(answer.curve());
    json.object("proof_flow", members -> evidence.flow(members, answer.proof().flow()));
  }

  private void asked(JsonText json) throws IOException {
    Wish wish = answer.wish();
    if (wish instanceof Wish.ByDate by) {
      json.text("by", by.date().toString());
    } else if (wish instanceof Wish.In in) {
      json.number("in", names.units(in.ticks()));
    } else if (wish instanceof Wish.Within within) {
      json.number("within", within.most().cents());
    }
  }

  private void met(JsonText json) throws IOException {
    json.number("duration", names.units(answer.finish().duration()));
    json.yesNo("as_planned_is_enough", answer.isMetAsPlanned());
    json.number("extra_cost", answer.extra().cents());
    if (answer.lastPrice().isPresent()) {
      json.number("last_price_per_unit", answer.lastPrice().get().cents());
    } else {
      json.nothing("last_price_per_unit");
    }
    json.number(
        "above_least_total", answer.finish().total().subtract(answer.curve().leastTotal().total()));
    json.array("bought", answer.bought(), this::bought);
    json.texts(
        "packages",
        answer.packages().stream()
            .map(index -> network.measures().packages().get(index).name())
            .toList());
    json.number("critical_chains", new BigDecimal(answer.chainCount()));
    Iterable<Integer> chains = IntStream.range(0, answer.chains().size()).boxed().toList();
    json.array(
        "chains",
        chains,
        (members, chain) -> {
          members.number("chain", chain + 1);
          members.texts("activities", names.ids(answer.chains().get(chain)));
        });
  }

  private void bought(JsonText json, MeetAnswer.Bought bought) throws IOException {
    Activity activity = network.activity(bought.activity());
    json.text("activity", activity.id());
    json.text("measure", MeasureNames.of(network, bought.measure()));
    json.number("from_duration", names.units(activity.normal()));
    json.number("to_duration", names.units(activity.normal() - bought.ticks()));
    json.number("units", names.units(bought.ticks()));
    if (bought.pricePerTick().isPresent()) {
      json.number(
          "price_per_unit",
          bought.pricePerTick().get().times(network.scale().ticksPerUnit()).cents());
    } else {
      json.nothing("price_per_unit");
    }
    json.number("cost", bought.cost().cents());
    if (bought.measure() != Plan.NO_MEASURE) {
      String measure = network.measures().get(bought.measure()).name();
      Optional<Way> spell = answer.of().buildUp().spell(bought.activity(), measure);
      if (spell.isPresent()) {
        json.object("built_up", members -> builtUp(members, spell.get().spell()));
      }
    }
    json.texts("on_chains", bought.onChains().stream().map(c -> String.valueOf(c + 1)).toList());
  }

  private static void builtUp(JsonText json, Spell spell) throws IOException {
    BuildUpJson.extra(json, spell.extra());
    json.texts("loss_sources", spell.lossSources());
  }

  private void proof(JsonText json) throws IOException {
    json.number("plan_cost", answer.proof().planCost());
    json.number("bound", answer.proof().bound());
    json.number("rounding", answer.proof().rounding());
    json.array("blocks", answer.proof().blocks(), MeetJson::block);
  }

  private static void block(JsonText json, PlanProof.Block block) throws IOException {
    ProofTable table = new ProofTable(block.network());
    json.text("branch", block.branch());
    json.array("rows", block.sheet().rows(), (members, row) -> row(members, table, row));
  }

  private static void row(JsonText json, ProofTable table, ProofSheet.Row row) throws IOException {
    if (row.arc().isPresent()) {
      json.text("event_from", table.event(row.arc().get().from()));
      json.text("event_to", table.event(row.arc().get().to()));
    }
    json.text("kind", table.kind(row));
    json.text("activity", table.owner(row));
    number(json, "length", row.length());
    number(json, "flow", row.flow());
    number(json, "capacity", row.capacity());
    number(json, "plan_cost", row.planCost());
    number(json, "bound", row.bound());
  }

  private static void number(JsonText json, String name, Optional<BigDecimal> number)
      throws IOException {
    if (number.isPresent()) {
      json.number(name, number.get());
    }
  }
}
