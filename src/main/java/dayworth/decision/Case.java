package dayworth.decision;

import dayworth.buildup.BuildUp;
import dayworth.contract.Due;
import dayworth.contract.MomentMoney;
import dayworth.contract.Terms;
import dayworth.engine.Ways;
import dayworth.engine.measures.HullNetwork;
import dayworth.engine.measures.Opening;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * A case that was read and found sound.
 *
 * @param name the case folder's name
 * @param title for people; may be empty
 * @param currency an ISO 4217 code or a symbol; may be empty
 * @param unit what a duration of one means
 * @param network the work to go: all of it, or what a status leaves
 * @param terms what time is worth for the whole
 * @param momentMoney sections and running costs
 * @param progress how far the work is; empty where time counts from the start
 * @param buildUp what working patterns buy in the activities whose labour is known
 * @param warnings doubtful input, sorted; they stand in every result
 * @param inputs the files it was read from, sorted by name
 * @param submission the paper in which it is put before a client
 */
public record Case(
    String name,
    String title,
    String currency,
    TimeUnit unit,
    Network network,
    Terms terms,
    MomentMoney momentMoney,
    Optional<Progress> progress,
    BuildUp buildUp,
    List<Notice> warnings,
    List<InputFile> inputs,
    Submission submission) {

  public Case {
    warnings = List.copyOf(warnings);
    inputs = List.copyOf(inputs);
  }

  /** A case of which no paper is known. */
  public Case(
      String name,
      String title,
      String currency,
      TimeUnit unit,
      Network network,
      Terms terms,
      MomentMoney momentMoney,
      Optional<Progress> progress,
      BuildUp buildUp,
      List<Notice> warnings,
      List<InputFile> inputs) {
    this(
        name,
        title,
        currency,
        unit,
        network,
        terms,
        momentMoney,
        progress,
        buildUp,
        warnings,
        inputs,
        Submission.NONE);
  }

  /** A case of which nothing has started, without sections and running costs. */
  public Case(
      String name,
      String title,
      String currency,
      TimeUnit unit,
      Network network,
      Terms terms,
      List<Notice> warnings,
      List<InputFile> inputs) {
    this(
        name,
        title,
        currency,
        unit,
        network,
        terms,
        MomentMoney.none(network.scale()),
        Optional.empty(),
        BuildUp.NONE,
        warnings,
        inputs);
  }

  /** The network with the convex money that hangs on moments as spans. */
  public Network pricedNetwork() {
    return momentMoney.spans().isEmpty() ? network : network.withSpans(momentMoney.spans());
  }

  /** Whether money hangs on durations alone and every activity goes along its line. */
  public boolean isPlain() {
    return momentMoney.isNone() && !network.hasChoices();
  }

  /** Whether all money is convex in the times, so that one flow proves each piece of the curve. */
  public boolean isConvex() {
    return momentMoney.charges().isEmpty() && !network.hasChoices();
  }

  /** The network where each activity may take any duration that its ways bound; convex. */
  Network boundingNetwork() {
    return network.hasChoices()
        ? HullNetwork.of(network, Opening.all(network, Ways.of(network)))
        : network;
  }

  /** Every activity at its shortest. */
  Plan everythingShortest() {
    return network.hasChoices() ? Ways.of(network).shortest() : Plan.allCrash(network);
  }

  /** How far an activity is. */
  public Status status(int activity) {
    return progress.map(all -> all.statuses().get(activity)).orElseGet(Status.NotStarted::new);
  }

  /** Whether an activity is still to be done, wholly or in part. */
  public boolean isToGo(int activity) {
    return !status(activity).isFinished();
  }

  /** Whether work that is to go is critical; what is finished never is. */
  public boolean isCritical(Timing timing, int activity) {
    return isToGo(activity) && timing.isCritical(activity);
  }

  public int criticalCount(Timing timing) {
    return (int) IntStream.range(0, network.size()).filter(i -> isCritical(timing, i)).count();
  }

  /** How many activities are still to be done. */
  public int toGo() {
    return network.size() - progress.map(Progress::finished).orElse(0);
  }

  /** The same case under another contract finish. */
  public Case dueBy(Due due) {
    return new Case(
        name,
        title,
        currency,
        unit,
        network,
        terms.dueBy(due),
        momentMoney,
        progress,
        buildUp,
        warnings,
        inputs,
        submission);
  }
}
