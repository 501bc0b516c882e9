package dayworth.report;

import dayworth.decision.ClaimRefuted;
import dayworth.decision.Fault;
import dayworth.engine.Ways;
import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.value.Money;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Adds up the branches of a proof sheet as its reader would: length × flow, capacities, what runs
 * into each event and out of it, and that no branch allows less than the plan costs.
 */
final class BlockCheck {

  private static final BigDecimal LAST_DIGIT = new BigDecimal("0.000001");

  private static final String PLAN = "proof_sheet.plan_cost";

  private final List<Fault> faults = new ArrayList<>();

  private final Network network;
  private final Ways ways;

  private BlockCheck(Network network) {
    this.network = network;
    this.ways = Ways.of(network);
  }

  /**
   * What does not add up.
   *
   * @param network of the case
   * @param sheet the member proof_sheet, its first block being the plan's
   * @throws ClaimRefuted if something is missing
   */
  static List<Fault> of(Network network, JsonPlace sheet) throws ClaimRefuted {
    BlockCheck check = new BlockCheck(network);
    BigDecimal least = null;
    BigDecimal rounding = BigDecimal.ZERO;
    List<JsonPlace> blocks = sheet.get("blocks").items();
    for (int k = 1; k < blocks.size(); k++) {
      JsonPlace block = blocks.get(k);
      if (!block.get("branch").text().equals(String.valueOf(k))) {
        check.wrong(block.get("branch"), String.valueOf(k));
      }
      BigDecimal bound = check.bound(block);
      least = least == null ? bound : least.min(bound);
      rounding = rounding.max(check.sum(block, "rounding"));
    }
    if (least == null) {
      throw sheet.get("blocks").wrong("a block for each branch");
    }
    check.equal(sheet.get("bound"), least);
    check.equal(sheet.get("rounding"), rounding);
    BigDecimal paid = sheet.get("plan_cost").number();
    // Both are written in decimals; what that may lose is stated to be below half a cent.
    if (paid.subtract(least).abs().compareTo(new BigDecimal("0.005")) >= 0) {
      check.faults.add(new Fault(PLAN, paid.toString(), least + ", the least bound of a branch"));
    }
    return check.faults;
  }

  private BigDecimal sum(JsonPlace block, String kind) throws ClaimRefuted {
    BigDecimal sum = BigDecimal.ZERO;
    for (JsonPlace row : block.get("rows").items()) {
      if (row.get("kind").text().equals(kind)) {
        sum = sum.add(row.get("bound").number());
      }
    }
    return sum;
  }

  private BigDecimal bound(JsonPlace block) throws ClaimRefuted {
    BigDecimal sum = BigDecimal.ZERO;
    Map<String, BigDecimal> left = new LinkedHashMap<>();
    for (JsonPlace row : block.get("rows").items()) {
      BigDecimal bound = row.get("bound").number();
      sum = sum.add(bound);
      ofCase(row);
      Optional<JsonPlace> flow = row.find("flow");
      if (flow.isPresent()) {
        BigDecimal amount = flow.get().number();
        equal(row.get("bound"), row.get("length").number().multiply(amount));
        Optional<JsonPlace> capacity = row.find("capacity");
        if (amount.signum() < 0
            || (capacity.isPresent() && amount.compareTo(capacity.get().number()) > 0)) {
          wrong(flow.get(), "from 0 to its capacity");
        }
        left.merge(row.get("event_from").text(), amount.negate(), BigDecimal::add);
        left.merge(row.get("event_to").text(), amount, BigDecimal::add);
      }
    }
    left.forEach(
        (event, rest) -> {
          if (rest.signum() != 0) {
            String found = rest + " more into " + event + " than out of it";
            faults.add(new Fault(block.place() + ".rows", found, "as much"));
          }
        });
    return sum;
  }

  /** What a row about an activity says of the activity itself. */
  private void ofCase(JsonPlace row) throws ClaimRefuted {
    OptionalInt index = network.indexOf(row.get("activity").text());
    if (index.isEmpty()) {
      return;
    }
    if (network.hasChoices()) {
      ofAnEnd(row, index.getAsInt());
      return;
    }
    Activity activity = network.activity(index.getAsInt());
    switch (row.get("kind").text()) {
      case "fixed" -> price(row.get("bound"), activity.normalCost().min(activity.crashCost()));
      case "slope" -> {
        equal(row.get("length"), network.scale().units(activity.normal()));
        price(row.get("capacity"), perUnit(activity.slope()));
      }
      case "slope back" -> {
        equal(row.get("length"), network.scale().units(-activity.crash()));
        price(row.get("capacity"), perUnit(activity.slope().negate()));
      }
      case "not shorter" -> equal(row.get("length"), network.scale().units(activity.crash()));
      case "not longer" -> equal(row.get("length"), network.scale().units(-activity.normal()));
      default -> {
        // The other arcs have their length from links and from the branch.
      }
    }
  }

  /**
   * Where measures are chosen a branch takes of each line the end that is cheaper beside the flow.
   * What it takes of an activity with a choice, the case alone does not tell.
   */
  private void ofAnEnd(JsonPlace row, int index) throws ClaimRefuted {
    if (ways.isChoice(index)) {
      return;
    }
    Activity activity = network.activity(index);
    String kind = row.get("kind").text();
    if (kind.equals("fixed")) {
      Money cost = Money.of(row.get("bound").number());
      if (!isNear(cost, activity.normalCost()) && !isNear(cost, activity.crashCost())) {
        wrong(row.get("bound"), activity.normalCost() + " or " + activity.crashCost());
      }
    } else if (kind.equals("not shorter") || kind.equals("not longer")) {
      BigDecimal length = row.get("length").number().abs();
      BigDecimal normal = network.scale().units(activity.normal());
      BigDecimal crash = network.scale().units(activity.crash());
      if (length.compareTo(normal) != 0 && length.compareTo(crash) != 0) {
        wrong(row.get("length"), normal + " or " + crash);
      }
    }
  }

  private Money perUnit(Money perTick) {
    return perTick.times(network.scale().ticksPerUnit());
  }

  /** Fractions without a last digit are written with six decimals or more. */
  private void price(JsonPlace found, Money right) throws ClaimRefuted {
    if (!isNear(Money.of(found.number()), right)) {
      wrong(found, right.toString());
    }
  }

  private static boolean isNear(Money found, Money right) {
    Money apart = found.minus(right);
    return apart.max(apart.negate()).compareTo(Money.of(LAST_DIGIT)) < 0;
  }

  private void equal(JsonPlace found, BigDecimal right) throws ClaimRefuted {
    if (found.number().compareTo(right) != 0) {
      wrong(found, right.toString());
    }
  }

  private void wrong(JsonPlace found, String right) {
    faults.add(new Fault(found.place(), found.value().shown(), right));
  }
}
