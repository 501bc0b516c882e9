package dayworth.network;

import dayworth.value.Money;

/**
 * A piece of contiguous work that can be done in its normal duration, or faster for other money:
 * along a straight line, or wholly or not at all.
 *
 * @param id unique in its network
 * @param name for people; may be empty
 * @param group trade, area or crew; may be empty
 * @param normal normal duration in ticks, at least 0
 * @param crash shortest duration in ticks, 0 to {@code normal}; {@code normal} if it cannot be
 *     compressed
 * @param normalCost direct cost at the normal duration
 * @param crashCost direct cost at the crash duration; {@code normalCost} if it cannot be compressed
 * @param notBefore earliest start in ticks after the project start; 0 for none
 * @param notFinishedBefore earliest finish in ticks after the project start; 0 for none
 * @param divisible whether it can take any duration between normal and crash; otherwise only these
 */
public record Activity(
    String id,
    String name,
    String group,
    long normal,
    long crash,
    Money normalCost,
    Money crashCost,
    long notBefore,
    long notFinishedBefore,
    boolean divisible) {

  public Activity {
    if (crash < 0 || normal < crash || notBefore < 0 || notFinishedBefore < 0) {
      throw new IllegalArgumentException(
          "activity " + id + ": 0 <= crash <= normal and earliest times >= 0 must hold");
    }
    if (crash == normal && !normalCost.equals(crashCost)) {
      throw new IllegalArgumentException(
          "activity " + id + ": a duration has one cost, so equal durations cost the same");
    }
  }

  /** A divisible activity. */
  public Activity(
      String id,
      String name,
      String group,
      long normal,
      long crash,
      Money normalCost,
      Money crashCost,
      long notBefore,
      long notFinishedBefore) {
    this(id, name, group, normal, crash, normalCost, crashCost, notBefore, notFinishedBefore, true);
  }

  /** A divisible activity whose finish waits for its start alone. */
  public Activity(
      String id,
      String name,
      String group,
      long normal,
      long crash,
      Money normalCost,
      Money crashCost,
      long notBefore) {
    this(id, name, group, normal, crash, normalCost, crashCost, notBefore, 0);
  }

  /** An activity that takes what it takes. */
  public static Activity fixed(String id, long duration, Money cost) {
    return new Activity(id, "", "", duration, duration, cost, cost, 0);
  }

  /** An activity that can be compressed along a straight line from normal to crash. */
  public static Activity compressible(
      String id, long normal, Money normalCost, long crash, Money crashCost) {
    return new Activity(id, "", "", normal, crash, normalCost, crashCost, 0);
  }

  /** The earliest start for a duration: the finish may be what has to wait. */
  long earliestStart(long duration) {
    return Math.max(notBefore, notFinishedBefore - duration);
  }

  public boolean isCompressible() {
    return crash < normal;
  }

  /** The most ticks that can be taken out. */
  public long mostShortening() {
    return normal - crash;
  }

  /** What all of the compression costs; negative where crashing is cheaper. */
  public Money crashExtra() {
    return crashCost.minus(normalCost);
  }

  /** The cost slope: money for each tick of compression; zero if it cannot be compressed. */
  public Money slope() {
    return isCompressible() ? crashExtra().dividedBy(mostShortening()) : Money.ZERO;
  }
}
