package dayworth.engine;

/**
 * What a step does to one activity.
 *
 * @param activity index in the network
 * @param shortened ticks taken out; negative if ticks are given back; never 0
 */
public record Change(int activity, long shortened) {

  public Change {
    if (shortened == 0) {
      throw new IllegalArgumentException("a change changes something");
    }
  }

  public boolean isRelaxation() {
    return shortened < 0;
  }
}
