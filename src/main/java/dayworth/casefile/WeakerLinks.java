package dayworth.casefile;

import dayworth.network.Relation;
import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Warns of a link beside one of the same two activities and relation with a longer lag. */
final class WeakerLinks {

  private record Kind(int predecessor, int successor, Relation relation) {

    static Kind of(LinkRow link) {
      return new Kind(link.predecessor(), link.successor(), link.relation());
    }
  }

  private WeakerLinks() {}

  static void report(ReadCase read, Findings findings) {
    Map<Kind, BigDecimal> longest = longest(read.links());
    for (LinkRow link : read.links()) {
      BigDecimal most = longest.get(Kind.of(link));
      if (link.lag().compareTo(most) < 0) {
        String right = "it can go: the same link with lag " + most.toPlainString() + " says more";
        findings.warning(
            link.place().notice("implied by another link", ImpliedLinks.named(read, link), right));
      }
    }
  }

  private static Map<Kind, BigDecimal> longest(List<LinkRow> links) {
    Map<Kind, BigDecimal> longest = new HashMap<>();
    links.forEach(link -> longest.merge(Kind.of(link), link.lag(), BigDecimal::max));
    return longest;
  }
}
