package dayworth.engine.stepping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.engine.Change;
import dayworth.engine.Curve;
import dayworth.engine.PieceWitness;
import dayworth.engine.Step;
import dayworth.network.Network;
import dayworth.testing.PublishedExample;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The curve against examples from the literature; the report names the source of each. */
class PublishedCurvesTest {

  static Stream<Arguments> examples() {
    return PublishedExample.sources().entrySet().stream()
        .map(example -> Arguments.of(example.getKey(), example.getValue()));
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("examples")
  void everyWholeDurationCostsWhatTheTableSays(String name, String source) {
    PublishedExample example = PublishedExample.read(name);
    Curve curve = Stepping.curve(example.network(), PieceWitness.NONE);
    example
        .leastCosts()
        .forEach((duration, cost) -> assertEquals(cost, curve.costAt(duration).cents(), source));
    assertEquals(example.leastCosts().keySet().iterator().next(), curve.shortest(), source);
  }

  @Test
  void allExamplesAreThere() {
    assertEquals(10, PublishedExample.sources().size());
  }

  /** Moder and Phillips: 1-2 goes from 6 to 4 days and back to 5 from 20 to 19 days; by hand. */
  @Test
  void moderAndPhillipsRelaxOneActivityExactlyOnce() {
    Curve curve = curve("moder-phillips-8");
    List<Step> relaxing =
        curve.steps().stream()
            .filter(step -> step.changes().stream().anyMatch(Change::isRelaxation))
            .toList();
    assertEquals(1, relaxing.size());
    assertEquals(20, relaxing.get(0).from());
    assertEquals(19, relaxing.get(0).to());
    List<Change> relaxed = relaxing.get(0).changes().stream().filter(Change::isRelaxation).toList();
    assertEquals(1, relaxed.size());
    assertEquals("1-2", curve.network().activity(relaxed.get(0).activity()).id());
    assertEquals(-1, relaxed.get(0).shortened());
  }

  /** Equally cheap plans from 34 to 30 weeks; none needs a relaxation. */
  @Test
  void hillierAndLiebermanRelaxNothing() {
    assertTrue(
        curve("hillier-reliable").steps().stream()
            .flatMap(step -> step.changes().stream())
            .noneMatch(Change::isRelaxation));
  }

  /** A 6 + 2 - B 8 + 1 + C 7 = 8, by hand. */
  @Test
  void anActivityPassedBackwardsStandsAtItsNormalDuration() {
    Curve curve = curve("own-reverse-critical");
    assertEquals(8, curve.shortest());
    Network network = curve.network();
    int reversed = network.indexOf("B").orElseThrow();
    assertEquals(8, curve.planAfter(curve.steps().size()).duration(reversed));
  }

  private static Curve curve(String name) {
    return Stepping.curve(PublishedExample.read(name).network(), PieceWitness.NONE);
  }
}
