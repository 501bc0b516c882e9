package dayworth.decision;

/** Is told what a long question is doing. */
@FunctionalInterface
public interface Watcher {

  /** Watches nothing. */
  Watcher NONE = doing -> {};

  /** What is being done now, in a few words. */
  void now(String doing);
}
