package dayworth.testing;

import dayworth.buildup.BuildUp;
import dayworth.contract.Bonus;
import dayworth.contract.Damages;
import dayworth.contract.Due;
import dayworth.contract.MomentMoney;
import dayworth.contract.Per;
import dayworth.contract.RunningCost;
import dayworth.contract.Section;
import dayworth.contract.Terms;
import dayworth.contract.TimeRelated;
import dayworth.decision.Case;
import dayworth.decision.TimeUnit;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Moment;
import dayworth.network.Network;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;

/** Two tiny cases with money that hangs on moments, to be worked by hand. */
public final class LateDeck {

  private LateDeck() {}

  /** A 5 days, 3 at 20 a day, then B 4; section "deck" is A, due on day 4; time costs 1 a day. */
  public static Case withRate(long rate) {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(
                Activity.compressible("A", 5, Money.ZERO, 3, Money.of(40)),
                Activity.fixed("B", 4, Money.ZERO)),
            List.of(Link.finishToStart(0, 1)));
    Damages damages = Damages.perUnit(Money.of(rate), BigDecimal.ZERO, Optional.empty());
    Section deck = new Section("deck", 0, Due.at(4), damages, Bonus.NONE);
    return of(network, 1, List.of(deck), List.of());
  }

  /** X 2 days and Y 10 side by side; a crane at 5 a day from X's start to Y's finish. */
  public static Case idleCrane() {
    Network network =
        new Network(
            TimeScale.WHOLE,
            List.of(Activity.fixed("X", 2, Money.ZERO), Activity.fixed("Y", 10, Money.ZERO)),
            List.of());
    RunningCost crane =
        new RunningCost("crane", Moment.startOf(0), Moment.finishOf(1), Money.of(5), Per.UNIT);
    return of(network, 100, List.of(), List.of(crane));
  }

  private static Case of(
      Network network, long dayCost, List<Section> sections, List<RunningCost> running) {
    TimeScale scale = network.scale();
    Terms terms =
        new Terms(
            scale,
            Optional.empty(),
            new TimeRelated(Money.of(dayCost), Per.UNIT),
            Money.ZERO,
            Optional.empty(),
            Damages.NONE,
            Bonus.NONE,
            Optional.empty());
    return new Case(
        "hand",
        "",
        "EUR",
        TimeUnit.DAY,
        network,
        terms,
        new MomentMoney(scale, Optional.empty(), sections, running),
        Optional.empty(),
        BuildUp.NONE,
        List.of(),
        List.of());
  }
}
