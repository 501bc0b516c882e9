package dayworth.casefile;

import dayworth.network.Activity;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;

/**
 * Warns of a not_before that makes compression worthless: the project takes as long as planned
 * however much is compressed, and without that not_before it could be shorter.
 *
 * <p>Every other not_before leaves the longest chain as it is, so the one with which that chain
 * begins is the only one to try.
 */
final class HoldingDate {

  private HoldingDate() {}

  static void report(ReadCase read, Findings findings) {
    Network network = read.reachable();
    ShortestFinish shortest = ShortestFinish.of(network);
    int holder = shortest.origin();
    if (holder == ShortestFinish.NONE
        || network.activities().stream().noneMatch(Activity::isCompressible)
        || asItStands(read.network()) > shortest.ticks()) {
      return;
    }
    long byThen = read.work().earliestStart(holder);
    long without = ShortestFinish.with(network, holder, byThen).ticks();
    if (without < shortest.ticks()) {
      String found =
          read.activities()
              .get(holder)
              .notBefore()
              .flatMap(Moment::date)
              .map(WorkingDays::named)
              .orElseGet(() -> network.scale().text(network.activity(holder).notBefore()));
      String right =
          "with it no finish is "
              + (read.calendar().isPresent() ? "before " : "shorter than ")
              + finish(read, shortest.ticks())
              + (read.progress().isEmpty()
                  ? ", as planned; without it "
                  : ", as it stands; without it ")
              + finish(read, without)
              + "; the chain: "
              + read.named(shortest.chain());
      findings.warning(
          read.place(holder, "not_before").notice("compression gains nothing", found, right));
    }
  }

  private static long asItStands(Network network) {
    return Timing.earliest(network, Plan.allNormal(network)).finish();
  }

  private static String finish(ReadCase read, long ticks) {
    return read.calendar()
        .map(calendar -> WorkingDays.named(calendar.finishDate(ticks)))
        .orElseGet(() -> read.network().scale().text(ticks));
  }
}
