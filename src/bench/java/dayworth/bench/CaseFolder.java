package dayworth.bench;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes a generated network, whole days and whole money, as a case that the program can read. */
final class CaseFolder {

  private CaseFolder() {}

  static void write(Network network, String title, Path folder) throws IOException {
    Files.createDirectories(folder);
    Files.writeString(
        folder.resolve("terms.csv"), "term,value\ntitle," + title + "\ntime_unit,day\n");
    try (PrintWriter out = writer(folder.resolve("activities.csv"))) {
      out.print("id,normal_duration,normal_cost,crash_duration,crash_cost\n");
      network.activities().forEach(activity -> out.print(row(activity)));
    }
    try (PrintWriter out = writer(folder.resolve("links.csv"))) {
      out.print("predecessor,successor,relation,lag\n");
      network.links().forEach(link -> out.print(row(network, link)));
    }
  }

  private static PrintWriter writer(Path file) throws IOException {
    return new PrintWriter(Files.newBufferedWriter(file, StandardCharsets.UTF_8));
  }

  private static String row(Activity activity) {
    String crash = activity.isCompressible() ? activity.crash() + "," + activity.crashCost() : ",";
    return activity.id()
        + ","
        + activity.normal()
        + ","
        + activity.normalCost()
        + ","
        + crash
        + "\n";
  }

  private static String row(Network network, Link link) {
    return network.activity(link.predecessor()).id()
        + ","
        + network.activity(link.successor()).id()
        + ","
        + link.relation()
        + ","
        + link.lag()
        + "\n";
  }
}
