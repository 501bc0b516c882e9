package dayworth.bench;

import dayworth.network.Network;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * Writes a generated network to files and describes it: {@code SHAPE [--case FOLDER] [--lp FILE
 * [DEADLINE]]}. Without a deadline the LP has the one halfway between the longest and the shortest
 * finish.
 */
public final class GenerateNetwork {

  private GenerateNetwork() {}

  public static void main(String[] arguments) throws IOException {
    if (arguments.length == 0) {
      System.err.println("usage: GenerateNetwork SHAPE [--case FOLDER] [--lp FILE [DEADLINE]]");
      System.exit(2);
    }
    Shape shape = Shape.valueOf(arguments[0].toUpperCase(Locale.ROOT));
    Network network = shape.network();
    Extent extent = Extent.of(network);
    System.out.printf(
        Locale.ROOT,
        "%s: %d activities, %d links; %d days as planned, at least %d; %d can become critical%n",
        shape,
        network.size(),
        network.links().size(),
        extent.longest(),
        extent.shortest(),
        extent.canBecomeCritical());
    for (int i = 1; i + 1 < arguments.length; i++) {
      Path target = Path.of(arguments[i + 1]);
      if (arguments[i].equals("--case")) {
        CaseFolder.write(network, shape.toString(), target);
      } else if (arguments[i].equals("--lp")) {
        boolean given = i + 2 < arguments.length && !arguments[i + 2].startsWith("--");
        writeProgram(network, given ? Long.parseLong(arguments[i + 2]) : extent.halfway(), target);
      }
    }
  }

  private static void writeProgram(Network network, long deadline, Path target) throws IOException {
    try (PrintWriter out =
        new PrintWriter(Files.newBufferedWriter(target, StandardCharsets.UTF_8))) {
      DeadlineProgram.write(network, deadline, out);
    }
    System.out.printf(Locale.ROOT, "deadline %d days%n", deadline);
  }
}
