package dayworth.decision;

import dayworth.engine.Curve;
import dayworth.engine.Flow;
import dayworth.network.Plan;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;

/** The cheapest plans of a case, with all money that hangs on when activities start and finish. */
sealed interface CheapestPlans permits ConvexPlans, BranchedPlans {

  /**
   * The curve of that money; where it is not convex a piece reaches from one finish that was solved
   * to the next.
   */
  Curve curve();

  /**
   * The plan for each of several finishes.
   *
   * @param durations ticks, from long to short
   */
  List<Plan> plans(SortedSet<Long> durations);

  /** Compares with the linear programme. */
  CrossCheck crossCheck(long most, Watcher watcher);

  /** How many of the finishes are not proved to be cheapest. */
  List<Unproved> unproved();

  /** How many convex problems were solved by branching. */
  long relaxations();

  /**
   * The flow that proves each piece of the curve, the first one its longest finish; empty if there
   * is none or they are too many to be carried.
   */
  Optional<List<List<Flow.Entry>>> flows();
}
