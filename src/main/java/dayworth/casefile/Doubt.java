package dayworth.casefile;

/** A rule for input that is possible but doubtful. */
@FunctionalInterface
interface Doubt {

  /** Warns of each place where it holds. */
  void report(ReadCase read, Findings findings);
}
