package dayworth.engine.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Flow;
import dayworth.engine.stepping.Stepping;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.SlopeScale;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The two columns are equal, and what is written balances at every event. */
class ProofSheetTest {

  private static final int SEEDS = 300;

  /** The bridge at 13: 3400 + 30·6 + 25·9 + 10·5 + 20·9 + 35·5 - 55·13 = 3495. */
  @Test
  void bothColumnsOfTheBridgeAddUpToItsCost() {
    HandWorked bridge = HandWorked.bridge();
    ProofSheet sheet =
        ProofSheet.of(bridge.network(), bridge.to().plan(), bridge.to().finish(), bridge.flow());
    assertEquals(0, new BigDecimal(3495).compareTo(sheet.planCost()));
    assertEquals(0, new BigDecimal(3495).compareTo(sheet.bound()));
    assertEquals(0, sheet.rounding().signum());
    // P 6 to 4 at 30: the plan pays 60, the flow bounds 30 x 6
    ProofSheet.Row p =
        sheet.rows().stream()
            .filter(row -> row.kind() == ProofSheet.Kind.ARC && row.activity() == 0)
            .filter(row -> row.arc().orElseThrow().over() == Arc.Over.SLOPE)
            .findFirst()
            .orElseThrow();
    assertEquals(new BigDecimal("60"), p.planCost().orElseThrow());
    assertEquals(new BigDecimal("180"), p.bound().orElseThrow());
    assertEquals(new BigDecimal("30"), p.capacity().orElseThrow());
  }

  @Test
  void aPlanThatIsNotCheapestHasNoSheet() {
    HandWorked bridge = HandWorked.bridge();
    Plan dear = Plan.of(new long[] {3, 9, 5, 9, 4});
    assertThrows(
        IllegalArgumentException.class,
        () -> ProofSheet.of(bridge.network(), dear, 13, bridge.flow()));
  }

  /**
   * A 10 to 7 for 100 and B 10 to 7 for 200 side by side: a unit costs 33.33.. + 66.66.. = 100, and
   * neither third has a last digit. At 8 units they cost 2 x 100 above their normal cost of 0.
   */
  @Test
  void thirdsAreCutSoThatTheyStillBalance() {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 10, Money.ZERO, 7, Money.of(100)),
                Activity.compressible("B", 10, Money.ZERO, 7, Money.of(200))),
            List.of());
    Plan plan = Plan.of(new long[] {8, 8});
    ProofSheet sheet = sheet(network, plan, 8);
    // 66.666667 + 133.333334, each rounded up; 10 x (33.333333 + 66.666666) - 8 x 99.999999
    assertEquals(new BigDecimal("200.000001"), sheet.planCost());
    assertEquals(new BigDecimal("200.000001"), sheet.bound());
    assertEquals(new BigDecimal("0.000003"), sheet.rounding());
    assertBalanced(network, sheet, "thirds");
  }

  @Test
  void everySheetOfRandomNetworksAddsUpAndBalances() {
    int rounded = 0;
    for (int seed = 0; seed < SEEDS; seed++) {
      Network network =
          RandomNetworks.of(
              seed,
              seed % 3 == 0 ? RandomNetworks.Kind.WITH_SPANS : RandomNetworks.Kind.EVERYTHING,
              3,
              25);
      String at = "seed " + seed;
      int[] sheets = {0, 0};
      Stepping.curve(
          network,
          (from, fromPlan, to, toPlan, flow) -> {
            ProofSheet sheet = ProofSheet.of(network, toPlan, to, flow);
            assertEquals(0, sheet.planCost().compareTo(sheet.bound()), at);
            BigDecimal gap =
                sheet.planCost().subtract(toPlan.cost(network).rounded(9, RoundingMode.UP));
            assertTrue(gap.abs().compareTo(new BigDecimal("0.005")) < 0, at + ": " + gap);
            assertTrue(sheet.rounding().compareTo(new BigDecimal("0.005")) < 0, at);
            assertBalanced(network, sheet, at);
            sheets[0]++;
            sheets[1] += sheet.rounding().signum();
          });
      assertTrue(sheets[0] > 0, at);
      rounded += sheets[1] > 0 ? 1 : 0;
    }
    assertTrue(rounded > SEEDS / 10, "too few sheets are rounded: " + rounded);
  }

  private static ProofSheet sheet(Network network, Plan plan, long finish) {
    ProofSheet[] found = new ProofSheet[1];
    Stepping.curve(
        network,
        (from, fromPlan, to, toPlan, flow) -> {
          if (to < finish && finish <= from) {
            found[0] = ProofSheet.of(network, plan, finish, flow);
          }
        });
    return found[0];
  }

  private static void assertBalanced(Network network, ProofSheet sheet, String at) {
    Map<Arc.Event, BigDecimal> left = new HashMap<>();
    for (ProofSheet.Row row : sheet.rows()) {
      if (row.arc().isPresent()) {
        Arc arc = row.arc().get();
        BigDecimal flow = row.flow().orElseThrow();
        assertTrue(flow.signum() >= 0, at);
        row.capacity().ifPresent(most -> assertTrue(flow.compareTo(most) <= 0, at));
        BigDecimal length = network.scale().units(arc.length());
        assertEquals(0, row.bound().orElseThrow().compareTo(length.multiply(flow)), at);
        left.merge(arc.from(), flow.negate(), BigDecimal::add);
        left.merge(arc.to(), flow, BigDecimal::add);
      }
    }
    left.forEach((event, rest) -> assertEquals(0, rest.signum(), at + ", " + event));
  }

  /** What is cut may not lose its balance even where cycles cross. */
  @Test
  void aFlowThatDoesNotBalanceIsRefused() {
    HandWorked bridge = HandWorked.bridge();
    Flow broken = new Flow(new SlopeScale(3, true), bridge.network());
    broken.set(Flow.Over.FROM_PROJECT, 0, 1);
    assertThrows(
        IllegalArgumentException.class,
        () -> ProofSheet.of(bridge.network(), bridge.to().plan(), 13, broken));
  }

  @Test
  void linksOfEveryRelationLeadBetweenTheRightEvents() {
    HandWorked all = HandWorked.allRelations();
    ProofSheet sheet = ProofSheet.of(all.network(), all.to().plan(), 15, all.flow());
    assertBalanced(all.network(), sheet, all.name());
    List<String> ends =
        sheet.rows().stream()
            .flatMap(row -> row.arc().stream())
            .filter(arc -> arc.over() == Arc.Over.LINK)
            .map(arc -> end(all.network().link(arc.index()), arc))
            .toList();
    assertEquals(
        List.of("FS finish start", "SS start start", "SF start finish", "FF finish finish"), ends);
  }

  private static String end(Link link, Arc arc) {
    return link.relation()
        + (arc.from().isFinish() ? " finish" : " start")
        + (arc.to().isFinish() ? " finish" : " start");
  }
}
