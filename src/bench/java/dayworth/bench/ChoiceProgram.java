package dayworth.bench;

import dayworth.engine.Way;
import dayworth.engine.Ways;
import dayworth.network.Link;
import dayworth.network.Network;
import java.io.PrintWriter;

/**
 * The cheapest choice of ways for one deadline as an integer program, in the CPLEX LP format: a
 * start for each activity and a yes or no for each of its ways. Finish-to-start links only.
 */
final class ChoiceProgram {

  private ChoiceProgram() {}

  static void write(Network network, long deadline, PrintWriter out) {
    Ways ways = Ways.of(network);
    out.print("Minimize\ncost:");
    for (int w = 0; w < ways.count(); w++) {
      out.printf("%n + %s x%d", ways.get(w).cost(), w);
    }
    out.print("\nSubject To\n");
    for (int i = 0; i < network.size(); i++) {
      out.printf("one%d:", i);
      for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
        out.printf(" + x%d", w);
      }
      out.printf(" = 1%n");
      out.printf("end%d: s%d", i, i);
      durations(ways, i, " + ", out);
      out.printf(" <= %d%n", deadline);
    }
    for (int j = 0; j < network.links().size(); j++) {
      Link link = network.link(j);
      out.printf("link%d: s%d - s%d", j, link.successor(), link.predecessor());
      durations(ways, link.predecessor(), " - ", out);
      out.printf(" >= %d%n", link.lag());
    }
    out.print("Binary\n");
    for (int w = 0; w < ways.count(); w++) {
      out.printf("x%d%n", w);
    }
    out.print("End\n");
  }

  private static void durations(Ways ways, int i, String sign, PrintWriter out) {
    for (int w = ways.first(i); w < ways.first(i) + ways.count(i); w++) {
      Way way = ways.get(w);
      out.printf("%s%d x%d", sign, way.duration(), w);
    }
  }
}
