package dayworth.report.picture;

import dayworth.casefile.CaseReader;
import dayworth.casefile.Reading;
import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.Per;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Case;
import dayworth.decision.CurveAnswer;
import dayworth.decision.CurveQuestion;
import dayworth.decision.FinishTooEarly;
import dayworth.decision.TimeUnit;
import dayworth.decision.Watcher;
import dayworth.network.Network;
import dayworth.testing.RandomNetworks;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;

/** Answers to draw. */
final class Answers {

  private Answers() {}

  static CurveAnswer ofDemo(String name) {
    Reading reading = CaseReader.read(Path.of("cases", name), TimeScale.WHOLE);
    return ask(((Reading.Sound) reading).of());
  }

  /** The ferry berth as it stands on 16 July 2027. */
  static CurveAnswer ofStatus() {
    Path folder = Path.of("src", "test", "resources", "demo", "ferry-berth-status");
    return ask(((Reading.Sound) CaseReader.read(folder, TimeScale.WHOLE)).of());
  }

  /** A network drawn from a seed, under terms drawn from the same seed. */
  static CurveAnswer ofSeed(long seed) {
    Network network = RandomNetworks.of(seed);
    return ask(of("drawn " + seed, "", "EUR", network, terms(network.scale(), new Random(seed))));
  }

  static Case of(String name, String title, String currency, Network network, Terms terms) {
    return new Case(name, title, currency, TimeUnit.DAY, network, terms, List.of(), List.of());
  }

  static CurveAnswer ask(Case of) {
    try {
      return CurveQuestion.ask(of, OptionalLong.empty(), 0, Watcher.NONE);
    } catch (FinishTooEarly impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  private static Terms terms(TimeScale scale, Random random) {
    long unit = scale.ticksPerUnit();
    return new Terms(
        scale,
        Optional.empty(),
        new TimeRelated(Money.of(random.nextInt(3) * 40L), Per.UNIT),
        Money.of(random.nextInt(2) * 5000L),
        random.nextInt(4) == 0 ? Optional.empty() : Optional.of(Due.at(random.nextInt(60) * unit)),
        Damages.perUnit(
            Money.of(random.nextInt(3) * 90L),
            BigDecimal.valueOf(random.nextInt(3)),
            Optional.empty()),
        new Bonus(Money.of(random.nextInt(3) * 30L), Per.UNIT, Optional.empty(), Optional.empty()));
  }
}
