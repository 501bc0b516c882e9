package dayworth.bench;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import java.io.PrintWriter;
import java.util.stream.IntStream;

/**
 * The least extra cost of one deadline as a linear program, in the CPLEX LP format that most
 * solvers read: a start s and a shortening y for each activity, a row for each link, and a row for
 * each finish that no link already holds before another finish.
 */
final class DeadlineProgram {

  private final Network network;
  private final long deadline;
  private final PrintWriter out;

  private DeadlineProgram(Network network, long deadline, PrintWriter out) {
    this.network = network;
    this.deadline = deadline;
    this.out = out;
  }

  static void write(Network network, long deadline, PrintWriter out) {
    DeadlineProgram program = new DeadlineProgram(network, deadline, out);
    out.print("Minimize\ncost:");
    IntStream.range(0, network.size()).forEach(program::cost);
    out.print("\nSubject To\n");
    IntStream.range(0, network.links().size()).forEach(program::linkRow);
    IntStream.range(0, network.size()).filter(program::mayFinishLast).forEach(program::finishRow);
    IntStream.range(0, network.size())
        .filter(i -> network.activity(i).notFinishedBefore() > 0)
        .forEach(program::earliestFinishRow);
    out.print("Bounds\n");
    IntStream.range(0, network.size()).forEach(program::bounds);
    out.print("End\n");
  }

  private void cost(int i) {
    Activity activity = network.activity(i);
    if (activity.isCompressible()) {
      out.printf("%n + %s y%d", activity.slope(), i);
    }
  }

  private void linkRow(int index) {
    Link link = network.link(index);
    int i = link.predecessor();
    int j = link.successor();
    long least = link.lag();
    out.printf("l%d: s%d", index, j);
    if (!link.relation().toStart()) {
      least -= network.activity(j).normal();
      shortening(" - ", j);
    }
    out.printf(" - s%d", i);
    if (!link.relation().fromStart()) {
      least += network.activity(i).normal();
      shortening(" + ", i);
    }
    out.printf(" >= %d%n", least);
  }

  private void finishRow(int i) {
    out.printf("f%d: s%d", i, i);
    shortening(" - ", i);
    out.printf(" <= %d%n", deadline - network.activity(i).normal());
  }

  private void earliestFinishRow(int i) {
    out.printf("e%d: s%d", i, i);
    shortening(" - ", i);
    out.printf(" >= %d%n", network.activity(i).notFinishedBefore() - network.activity(i).normal());
  }

  private void shortening(String sign, int i) {
    if (network.activity(i).isCompressible()) {
      out.printf("%sy%d", sign, i);
    }
  }

  private void bounds(int i) {
    Activity activity = network.activity(i);
    if (activity.notBefore() > 0) {
      out.printf("s%d >= %d%n", i, activity.notBefore());
    }
    if (activity.isCompressible()) {
      out.printf("0 <= y%d <= %d%n", i, activity.mostShortening());
    }
  }

  private boolean mayFinishLast(int i) {
    for (int k = 0; k < network.linksOutOf(i); k++) {
      Link link = network.link(network.linkOutOf(i, k));
      if (!link.relation().fromStart() && link.lag() >= 0) {
        return false;
      }
    }
    return true;
  }
}
