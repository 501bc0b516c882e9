package dayworth.engine;

import dayworth.network.Plan;

/** Is told each piece of a curve while it is found, with what proves it. */
@FunctionalInterface
public interface PieceWitness {

  /** Wants to know nothing. */
  PieceWitness NONE = (from, fromPlan, to, toPlan, flow) -> {};

  /**
   * One piece: its flow proves both its ends, and with them every point between.
   *
   * <p>The first call is of the first breakpoint alone ({@code from == to}), which no plan beats
   * however long it may take.
   *
   * @param flow valid only during the call
   */
  void piece(long from, Plan fromPlan, long to, Plan toPlan, Flow flow);
}
