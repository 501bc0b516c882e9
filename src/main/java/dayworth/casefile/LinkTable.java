package dayworth.casefile;

import dayworth.network.Link;
import dayworth.network.Loop;
import dayworth.network.Relation;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Reads the logic: the predecessors of activities.csv and the rows of links.csv. */
final class LinkTable {

  static final String FILE = "links.csv";

  private static final List<Column> COLUMNS =
      List.of(
          Column.needed("predecessor"),
          Column.needed("successor"),
          Column.needed("relation"),
          Column.optional("lag").withNumbers());

  private static final WordCell<Relation> RELATION =
      WordCell.<Relation>of("relation")
          .with("FS", Relation.FS)
          .with("SS", Relation.SS)
          .with("FF", Relation.FF)
          .with("SF", Relation.SF);

  private final List<ActivityRow> activities;

  private final ActivityIds ids;
  private final Findings findings;
  private final List<LinkRow> links = new ArrayList<>();
  private final Set<Object> seen = new HashSet<>();

  private LinkTable(Optional<List<ActivityRow>> known, Findings findings) {
    activities = known.orElse(List.of());
    ids = new ActivityIds(known, findings);
    this.findings = findings;
  }

  /**
   * All links whose two ends exist; loops and all other faults are reported.
   *
   * @param known the activities; empty where their ids could not be read
   */
  static List<LinkRow> read(
      Optional<List<ActivityRow>> known, Optional<String> text, Findings findings) {
    LinkTable table = new LinkTable(known, findings);
    for (int i = 0; i < table.activities.size(); i++) {
      table.addPredecessors(i);
    }
    text.flatMap(csv -> Table.of(FILE, csv, COLUMNS, findings)).ifPresent(table::addRows);
    table.reportLoops();
    return table.links;
  }

  private void addPredecessors(int successor) {
    ActivityRow row = activities.get(successor);
    Place place = new Place(ActivityTable.FILE, row.line(), "predecessors");
    for (String id : row.predecessors()) {
      ids.index(place, id)
          .ifPresent(from -> add(place, from, successor, Relation.FS, BigDecimal.ZERO));
    }
  }

  private void addRows(Table table) {
    for (Row row : table.rows()) {
      CellParser<String> plain = (text, style) -> text;
      Cell<String> from = table.needed(row, "predecessor", plain, findings);
      Cell<String> to = table.needed(row, "successor", plain, findings);
      Cell<Relation> relation = table.needed(row, "relation", RELATION, findings);
      Cell<BigDecimal> lag = table.cell(row, "lag", TimeCell.LAG, findings);
      Optional<Integer> tail =
          from.value().flatMap(id -> ids.index(table.place(row, "predecessor"), id));
      Optional<Integer> head =
          to.value().flatMap(id -> ids.index(table.place(row, "successor"), id));
      if (tail.isPresent() && head.isPresent() && !relation.faulty() && !lag.faulty()) {
        relation
            .value()
            .ifPresent(
                kind ->
                    add(
                        new Place(FILE, row.line(), ""),
                        tail.get(),
                        head.get(),
                        kind,
                        lag.value().orElse(BigDecimal.ZERO)));
      }
    }
  }

  private void add(Place place, int from, int to, Relation relation, BigDecimal lag) {
    if (from == to) {
      findings.problem(place.notice("linked to itself", id(from), "another activity"));
    } else if (!seen.add(List.of(from, to, relation, lag.stripTrailingZeros()))) {
      String found = id(from) + " before " + id(to);
      findings.problem(place.notice("the same link a second time", found, "take one out"));
    } else {
      links.add(new LinkRow(place, from, to, relation, lag));
    }
  }

  private void reportLoops() {
    List<Link> plain =
        links.stream()
            .map(link -> Link.finishToStart(link.predecessor(), link.successor()))
            .toList();
    for (List<Integer> loop : Loop.in(activities.size(), plain)) {
      LinkRow closing = links.get(loop.get(loop.size() - 1));
      List<String> chain = new ArrayList<>();
      chain.add(id(closing.successor()));
      loop.forEach(link -> chain.add(id(links.get(link).successor())));
      findings.problem(
          closing
              .place()
              .notice(
                  "a loop: " + String.join(", ", chain),
                  id(closing.predecessor()) + " before " + id(closing.successor()),
                  "take out one of the " + loop.size() + " links"));
    }
  }

  private String id(int activity) {
    return activities.get(activity).id();
  }
}
