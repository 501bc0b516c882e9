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

/** What of the network's picture is the same at every finish: boxes, lanes, links and scale. */
final class NetworkLayout {

  static final double LEFT = 74;
  static final double RIGHT = 26;
  static final double TOP = 62;
  static final double PITCH = 87;
  static final double BOX = 60;
  static final double BEFORE = 7;
  static final double AFTER = 3;
  static final double PAGE = 1040;

  private static final double LEAST = 44;

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

  NetworkLayout(BriefAnswer answer, Words words) {
    this.answer = answer;
    this.choice = NetworkChoice.of(answer);
    this.lanes = Lanes.of(answer, choice.shown());
    this.lane = new int[choice.shown().size()];
    this.least = new double[choice.shown().size()];
    Network network = answer.of().network();
    long longest = answer.states().get(0).finish().duration();
    double figures = 2 * Face.MEDIUM.width(words.figure(longest), 12);
    for (int b = 0; b < lane.length; b++) {
      int activity = choice.shown().get(b);
      boxOf.put(activity, b);
      Activity one = network.activity(activity);
      least[b] =
          Math.max(
              LEAST,
              figures
                  + Face.SEMIBOLD.width(Words.shortId(one), 12)
                  + BEFORE
                  + AFTER
                  + 18);
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
    this.frames =
        answer.states().stream().map(state -> NetworkFrame.of(state, choice.shown())).toList();
    this.perTick = scale(Math.max(1, longest));
    this.width =
        Math.max(
            PAGE,
            LEFT
                + RIGHT
                + frames.stream().mapToDouble(frame -> ruler(frame).width()).max().orElse(0));
  }

  /** Even if all have room on the page; otherwise long work is drawn narrower, down to a limit. */
  private double scale(long longest) {
    double even = (PAGE - LEFT - RIGHT) / longest;
    for (double share = 1; share > NARROWEST; share -= 0.05) {
      double perTick = even * share;
      if (new TimeRuler(frames.get(0), least, perTick).width() <= PAGE - LEFT - RIGHT) {
        return perTick;
      }
    }
    return even * NARROWEST;
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
