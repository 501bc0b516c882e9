package dayworth.bench;

import dayworth.engine.Ways;
import dayworth.engine.branching.Branching;
import dayworth.engine.branching.Point;
import dayworth.network.Network;
import dayworth.network.Plan;
import dayworth.network.Timing;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.LongStream;

/**
 * The whole front of a network with measures beside single deadlines of it by an integer solver,
 * cbc, and by OR-Tools CP-SAT: {@code SIZE NODES SECONDS}. Nodes are Dayworth's for each finish on
 * average, seconds the others' for each deadline.
 */
public final class MeasureComparison {

  private static final int DEADLINES = 5;
  private static final Pattern CBC =
      Pattern.compile(
          "(?:Objective value|Lower bound|Total time \\(CPU seconds\\)):\\s+([-0-9.e+]+)");

  private MeasureComparison() {}

  public static void main(String[] arguments) throws IOException, InterruptedException {
    if (arguments.length != 3) {
      System.err.println("usage: MeasureComparison SIZE NODES SECONDS");
      System.exit(2);
    }
    Network network = MeasuredNetwork.of(Integer.parseInt(arguments[0]));
    int seconds = Integer.parseInt(arguments[2]);
    long longest = Timing.earliest(network, Plan.allNormal(network)).finish();
    long shortest = Timing.earliest(network, Ways.of(network).shortest()).finish();
    long[] durations =
        LongStream.rangeClosed(0, longest - shortest).map(k -> longest - k).toArray();
    long start = System.nanoTime();
    List<Point> points =
        Branching.solve(
            network, List.of(), durations, Long.parseLong(arguments[1]) * durations.length);
    double took = (System.nanoTime() - start) / 1e9;
    long proved = points.stream().filter(Point::isProved).count();
    double gap = points.stream().mapToDouble(MeasureComparison::gap).max().orElseThrow();
    System.out.printf(
        Locale.ROOT,
        "%d activities, %d finishes from %d to %d: whole front %.1f s, %d proved, gap at most"
            + " %.3f %%, %d MB%n",
        network.size(),
        points.size(),
        longest,
        shortest,
        took,
        proved,
        100 * gap,
        (Runtime.getRuntime().totalMemory() - Runtime.getRuntime().freeMemory()) >> 20);
    for (int k = 0; k < DEADLINES; k++) {
      compare(network, points.get((2 * k + 1) * (points.size() - 1) / (2 * DEADLINES)), seconds);
    }
  }

  private static double gap(Point point) {
    return point.cost().minus(point.bound()).toDouble() / point.cost().toDouble();
  }

  private static void compare(Network network, Point point, int seconds)
      throws IOException, InterruptedException {
    ChoiceModel.Found model = ChoiceModel.solve(network, point.duration(), seconds);
    String cbc = cbc(network, point.duration(), seconds);
    System.out.printf(
        Locale.ROOT,
        "  %d: Dayworth %.0f (bound %.0f) | CP-SAT %.0f (bound %.0f) %.2f s | cbc %s%n",
        point.duration(),
        point.cost().toDouble(),
        point.bound().toDouble(),
        model.cost(),
        model.bound(),
        model.seconds(),
        cbc);
  }

  private static String cbc(Network network, long deadline, int seconds)
      throws IOException, InterruptedException {
    Path program = Files.createTempFile("choice", ".lp");
    try (PrintWriter out =
        new PrintWriter(Files.newBufferedWriter(program, StandardCharsets.UTF_8))) {
      ChoiceProgram.write(network, deadline, out);
    }
    Process process =
        new ProcessBuilder(
                "cbc", program.toString(), "-seconds", String.valueOf(seconds), "-solve", "-quit")
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    process.waitFor();
    Files.delete(program);
    StringBuilder found = new StringBuilder();
    Matcher matcher = CBC.matcher(said);
    while (matcher.find()) {
      found.append(matcher.group().replaceAll("\\s+", " ")).append("; ");
    }
    return found.toString();
  }
}
