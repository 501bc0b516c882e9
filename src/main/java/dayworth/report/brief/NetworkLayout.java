package dayworth.report.brief;

import dayworth.decision.BriefAnswer;
import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.report.brief.svg.Face;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;

/** What of the network's picture is the same at every finish: boxes, lanes, links and scale. */
final class NetworkLayout {

  static final double RIGHT = 26;
  static final double TOP = 62;
  static final double PITCH = 87;
  static final double BOX = 60;
  static final double BEFORE = 7;
  static final double AFTER = 3;
  static final double PAGE = 1040;

  private static final double LEAST = 40;
  private static final double LEAST_GUTTER = 74;
  private static final double MOST_GUTTER = 112;
  private static final double MOST_NAMED = 84;

  /** So much narrower than even may long work be drawn, that short work has room. */
  private static final double NARROWEST = 0.3;

  private final BriefAnswer answer;
  private final NetworkChoice choice;
  private final List<List<Integer>> lanes;
  private final int[] lane;
  private final double[] least;
  private final List<Link> links = new ArrayList<>();
  private final Map<Integer, Integer> boxOf = new HashMap<>();
  private final List<NetworkFrame> frames;
  private final double perTick;
  private final double width;
  private final double left;

  NetworkLayout(BriefAnswer answer, Words words) {
    this.answer = answer;
    this.choice = NetworkChoice.of(answer);
    this.lanes = Lanes.of(answer, choice.shown());
    this.lane = new int[choice.shown().size()];
    this.least = new double[choice.shown().size()];
    Network network = answer.of().network();
    long longest = answer.states().get(0).finish().duration();
    this.frames =
        answer.states().stream().map(state -> NetworkFrame.of(state, choice.shown())).toList();
    double figures = 2 * Face.MEDIUM.width(words.figure(longest), 12);
    for (int b = 0; b < lane.length; b++) {
      int activity = choice.shown().get(b);
      boxOf.put(activity, b);
      Activity one = network.activity(activity);
      double corners = Math.max(figures, corners(b, words));
      double first = corners + Face.SEMIBOLD.width(Words.shortId(one), 12) + 18;
      least[b] = Math.max(first, Math.max(LEAST, named(Words.name(one)))) + BEFORE + AFTER;
      for (int l = 0; l < lanes.size(); l++) {
        if (lanes.get(l).contains(activity)) {
          lane[b] = l;
        }
      }
    }
    network.links().stream()
        .filter(
            link -> boxOf.containsKey(link.predecessor()) && boxOf.containsKey(link.successor()))
        .forEach(links::add);
    this.left = gutter();
    this.perTick = scale(Math.max(1, longest));
    this.width =
        Math.max(
            PAGE,
            left
                + RIGHT
                + frames.stream().mapToDouble(frame -> ruler(frame).width()).max().orElse(0));
  }

  /** What the two figures beside the id need, or those beside the float, at any finish. */
  private double corners(int b, Words words) {
    return frames.stream()
        .flatMapToDouble(
            frame ->
                DoubleStream.of(
                    both(frame.early(b), frame.duration(b), words),
                    both(frame.late(b), frame.duration(b), words)))
        .max()
        .orElse(0);
  }

  private static double both(long from, long duration, Words words) {
    return Face.MEDIUM.width(words.figure(from), 12)
        + Face.MEDIUM.width(words.figure(from + duration), 12);
  }

  /** What a name on two lines needs; a very long one is cut. */
  private static double named(String name) {
    double room = LEAST;
    while (room < MOST_NAMED
        && Face.MEDIUM.wrap(name, 12, room - 8, 2).stream().anyMatch(l -> l.endsWith("…"))) {
      room += 4;
    }
    return room;
  }

  /** Even if all have room on the page; otherwise long work is drawn narrower, down to a limit. */
  private double scale(long longest) {
    double even = (PAGE - left - RIGHT) / longest;
    for (double share = 1; share > NARROWEST; share -= 0.05) {
      double perTick = even * share;
      if (new TimeRuler(frames.get(0), least, perTick).width() <= PAGE - left - RIGHT) {
        return perTick;
      }
    }
    return even * NARROWEST;
  }

  /** As wide as the longest word of a lane's name needs. */
  private double gutter() {
    double widest = LEAST_GUTTER;
    for (List<Integer> one : lanes) {
      for (String word : laneName(one).split(" ", -1)) {
        widest = Math.max(widest, Face.SEMIBOLD.width(word, 13) + 8);
      }
    }
    return Math.min(widest, MOST_GUTTER);
  }

  /** The groups that do most of a lane's work. */
  String laneName(List<Integer> one) {
    return Lanes.name(
        answer.of().network(), answer.states().get(answer.chosenState()).timing(), one);
  }

  /** How much room the names of lanes have. */
  double left() {
    return left;
  }

  TimeRuler ruler(NetworkFrame frame) {
    return new TimeRuler(frame, least, perTick);
  }

  NetworkFrame frame(int state) {
    return frames.get(state);
  }

  List<Integer> shown() {
    return choice.shown();
  }

  Map<String, List<Integer>> rest() {
    return choice.rest();
  }

  List<List<Integer>> lanes() {
    return lanes;
  }

  int lane(int box) {
    return lane[box];
  }

  double least(int box) {
    return least[box];
  }

  double perTick() {
    return perTick;
  }

  int box(int activity) {
    return boxOf.get(activity);
  }

  /** Links between boxes. */
  List<Link> links() {
    return links;
  }

  Activity activity(int box) {
    return answer.of().network().activity(choice.shown().get(box));
  }

  double width() {
    return width;
  }

  double top(int lane) {
    return TOP + lane * PITCH;
  }

  /** Where lanes end and the rest begins. */
  double bottom() {
    return TOP + lanes.size() * PITCH - (PITCH - BOX) + 14;
  }

  double height() {
    return bottom() + choice.rest().size() * 34 + 40;
  }
}
