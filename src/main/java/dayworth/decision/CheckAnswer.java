package dayworth.decision;

import dayworth.network.Timing;
import java.math.BigInteger;
import java.util.List;

/**
 * The facts of a case's network: the answer of {@code dayworth check}.
 *
 * @param of the case
 * @param asPlanned the times with every activity its normal way
 * @param shortest the shortest finish that is possible, ticks
 * @param chainCount how many critical chains there are as planned; exact
 * @param firstChains the first few of them, as activity indices
 * @param nearCritical activities with the least floats above zero, least first
 * @param openStarts activities to go that wait for none to go
 * @param openEnds activities to go for which none to go waits
 * @param neverCritical compressible activities that no finish on the curve makes critical
 */
public record CheckAnswer(
    Case of,
    Timing asPlanned,
    long shortest,
    BigInteger chainCount,
    List<List<Integer>> firstChains,
    List<Integer> nearCritical,
    List<Integer> openStarts,
    List<Integer> openEnds,
    List<NeverCritical> neverCritical) {

  public CheckAnswer {
    firstChains = List.copyOf(firstChains);
    nearCritical = List.copyOf(nearCritical);
    openStarts = List.copyOf(openStarts);
    openEnds = List.copyOf(openEnds);
    neverCritical = List.copyOf(neverCritical);
  }

  /**
   * An activity whose compression gains nothing.
   *
   * @param longestThrough the longest chain through it as planned, ticks; less than the shortest
   *     finish
   */
  public record NeverCritical(int activity, long longestThrough) {}
}
