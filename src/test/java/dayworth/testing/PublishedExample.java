package dayworth.testing;

import dayworth.network.Activity;
import dayworth.network.Link;
import dayworth.network.Network;
import dayworth.network.Relation;
import dayworth.value.Money;
import dayworth.value.TimeScale;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** One of the examples in the test resources, read without the program's own reader. */
public record PublishedExample(Network network, Map<Long, BigDecimal> leastCosts) {

  /** The name of each example and where it comes from, as SOURCES.md has them. */
  public static Map<String, String> sources() {
    try (InputStream in = PublishedExample.class.getResourceAsStream("/published/SOURCES.md")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      Map<String, String> sources = new TreeMap<>();
      text.lines()
          .filter(
              line ->
                  line.startsWith("| ")
                      && !line.startsWith("| folder")
                      && !line.startsWith("| ---"))
          .map(line -> line.split(" \\| ", -1))
          .forEach(cells -> sources.put(cells[0].substring(2), cells[1]));
      return sources;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Reads an example by its folder's name. */
  public static PublishedExample read(String name) {
    List<String[]> rows = rows(name, "activities.csv");
    List<String> ids = rows.stream().map(row -> row[0]).toList();
    List<Activity> activities = new ArrayList<>();
    List<Link> links = new ArrayList<>();
    for (String[] row : rows) {
      activities.add(activity(row));
      for (String predecessor : row[5].isEmpty() ? new String[0] : row[5].split(";", -1)) {
        links.add(Link.finishToStart(ids.indexOf(predecessor), ids.indexOf(row[0])));
      }
    }
    for (String[] row : rows(name, "links.csv")) {
      Relation relation = Relation.valueOf(row[2]);
      links.add(
          new Link(ids.indexOf(row[0]), ids.indexOf(row[1]), relation, Long.parseLong(row[3])));
    }
    Map<Long, BigDecimal> leastCosts = new TreeMap<>();
    for (String[] row : rows(name, "expected.csv")) {
      leastCosts.put(Long.valueOf(row[0]), new BigDecimal(row[1]).setScale(2));
    }
    return new PublishedExample(new Network(TimeScale.WHOLE, activities, links), leastCosts);
  }

  private static Activity activity(String[] row) {
    Money cost = money(row[2]);
    long normal = Long.parseLong(row[1]);
    return row[3].isEmpty()
        ? Activity.fixed(row[0], normal, cost)
        : Activity.compressible(row[0], normal, cost, Long.parseLong(row[3]), money(row[4]));
  }

  private static Money money(String cell) {
    return Money.of(new BigDecimal(cell));
  }

  /** The rows below the header; none if there is no such file. */
  private static List<String[]> rows(String name, String file) {
    String path = "/published/" + name + "/" + file;
    try (InputStream in = PublishedExample.class.getResourceAsStream(path)) {
      if (in == null) {
        return List.of();
      }
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines().skip(1).map(line -> line.split(",", -1)).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
