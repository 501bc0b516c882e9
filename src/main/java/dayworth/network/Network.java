package dayworth.network;

import dayworth.value.TimeScale;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.function.ToIntFunction;

/**
 * The activities of a project and the links between them; no loop of activities. Immutable.
 *
 * <p>Activities and links are known by their index, which is their order in the file.
 */
public final class Network {

  private final TimeScale scale;
  private final List<Activity> activities;
  private final List<Link> links;
  private final List<Span> spans;
  private final Measures measures;
  private final Map<String, Integer> indexById = new HashMap<>();
  private final int[] order;

  /** Links into activity i are {@code into[firstInto[i]] .. into[firstInto[i + 1] - 1]}. */
  private final int[] firstInto;

  private final int[] into;
  private final int[] firstOutOf;
  private final int[] outOf;

  /**
   * Joins activities and links.
   *
   * @throws IllegalArgumentException if ids repeat, a link leads nowhere or to itself, or there is
   *     a loop (see {@link Loop#in})
   */
  public Network(TimeScale scale, List<Activity> activities, List<Link> links) {
    this(scale, activities, links, List.of());
  }

  /**
   * Joins activities and links, with money that runs between moments.
   *
   * @throws IllegalArgumentException as without; or if a span's moment is of no activity
   */
  public Network(TimeScale scale, List<Activity> activities, List<Link> links, List<Span> spans) {
    this(scale, activities, links, spans, Measures.NONE);
  }

  /**
   * Joins activities and links, with money that runs between moments and with measures.
   *
   * @throws IllegalArgumentException as without; or if a measure is of no activity
   */
  public Network(
      TimeScale scale,
      List<Activity> activities,
      List<Link> links,
      List<Span> spans,
      Measures measures) {
    this.scale = scale;
    this.activities = List.copyOf(activities);
    this.links = List.copyOf(links);
    this.spans = List.copyOf(spans);
    this.measures = measures;
    for (int i = 0; i < activities.size(); i++) {
      if (indexById.put(activities.get(i).id(), i) != null) {
        throw new IllegalArgumentException("two activities are called " + activities.get(i).id());
      }
    }
    links.forEach(this::requireEnds);
    spans.forEach(this::requireMoments);
    measures.list().forEach(this::requireActivity);
    firstInto = firsts(Link::successor);
    into = grouped(firstInto, Link::successor);
    firstOutOf = firsts(Link::predecessor);
    outOf = grouped(firstOutOf, Link::predecessor);
    order = topologicalOrder();
  }

  public TimeScale scale() {
    return scale;
  }

  public int size() {
    return activities.size();
  }

  public List<Activity> activities() {
    return activities;
  }

  public Activity activity(int index) {
    return activities.get(index);
  }

  public List<Link> links() {
    return links;
  }

  public Link link(int index) {
    return links.get(index);
  }

  /** Money that runs between moments; by their index. */
  public List<Span> spans() {
    return spans;
  }

  /** Ways to do activities that are taken wholly or not at all. */
  public Measures measures() {
    return measures;
  }

  /** Whether some activity has ways that are taken wholly or not at all. */
  public boolean hasChoices() {
    return !measures.isNone()
        || activities.stream().anyMatch(each -> each.isCompressible() && !each.divisible());
  }

  /** The same network with other money between moments. */
  public Network withSpans(List<Span> others) {
    return new Network(scale, activities, links, others, measures);
  }

  /** The same network with other activities of the same number, and other measures. */
  public Network withActivities(List<Activity> others, Measures otherMeasures) {
    return new Network(scale, others, links, spans, otherMeasures);
  }

  public OptionalInt indexOf(String id) {
    Integer index = indexById.get(id);
    return index == null ? OptionalInt.empty() : OptionalInt.of(index);
  }

  /** The activity that comes at {@code position} when every predecessor comes first. */
  public int inOrder(int position) {
    return order[position];
  }

  public int linksInto(int activity) {
    return firstInto[activity + 1] - firstInto[activity];
  }

  /** The index of the k-th link into an activity. */
  public int linkInto(int activity, int k) {
    return into[firstInto[activity] + k];
  }

  public int linksOutOf(int activity) {
    return firstOutOf[activity + 1] - firstOutOf[activity];
  }

  /** The index of the k-th link out of an activity. */
  public int linkOutOf(int activity, int k) {
    return outOf[firstOutOf[activity] + k];
  }

  /** Activities without a successor, in file order. */
  public List<Integer> openEnds() {
    return without(firstOutOf);
  }

  /** Activities without a predecessor, in file order. */
  public List<Integer> openStarts() {
    return without(firstInto);
  }

  private List<Integer> without(int[] firsts) {
    List<Integer> found = new ArrayList<>();
    for (int i = 0; i < size(); i++) {
      if (firsts[i] == firsts[i + 1]) {
        found.add(i);
      }
    }
    return found;
  }

  private void requireMoments(Span span) {
    if (span.from().activity() >= size() || span.to().activity() >= size()) {
      throw new IllegalArgumentException("span " + span.name() + " is of no activity");
    }
  }

  private void requireActivity(Measure measure) {
    if (measure.activity() >= size()) {
      throw new IllegalArgumentException("measure " + measure.name() + " is of no activity");
    }
  }

  private void requireEnds(Link link) {
    int most = activities.size() - 1;
    if (link.predecessor() < 0
        || link.successor() < 0
        || link.predecessor() > most
        || link.successor() > most
        || link.predecessor() == link.successor()) {
      throw new IllegalArgumentException("a link needs two different activities: " + link);
    }
  }

  private int[] firsts(ToIntFunction<Link> end) {
    int[] firsts = new int[activities.size() + 1];
    for (Link link : links) {
      firsts[end.applyAsInt(link) + 1]++;
    }
    for (int i = 0; i < activities.size(); i++) {
      firsts[i + 1] += firsts[i];
    }
    return firsts;
  }

  private int[] grouped(int[] firsts, ToIntFunction<Link> end) {
    int[] next = firsts.clone();
    int[] grouped = new int[links.size()];
    for (int j = 0; j < grouped.length; j++) {
      grouped[next[end.applyAsInt(links.get(j))]++] = j;
    }
    return grouped;
  }

  private int[] topologicalOrder() {
    int[] ordered = new int[size()];
    int[] waiting = new int[size()];
    int found = 0;
    for (int i = 0; i < size(); i++) {
      waiting[i] = linksInto(i);
      if (waiting[i] == 0) {
        ordered[found++] = i;
      }
    }
    for (int read = 0; read < found; read++) {
      int activity = ordered[read];
      for (int k = 0; k < linksOutOf(activity); k++) {
        int successor = links.get(linkOutOf(activity, k)).successor();
        if (--waiting[successor] == 0) {
          ordered[found++] = successor;
        }
      }
    }
    if (found < size()) {
      throw new IllegalArgumentException("the links make a loop");
    }
    return ordered;
  }
}
