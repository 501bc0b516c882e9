package dayworth.casefile;

import dayworth.network.Link;

/**
 * Warns of a finish-to-start link that a chain of other finish-to-start links implies.
 *
 * <p>Where a chain's lags and the least durations of the activities on it reach the link's lag, the
 * link says nothing that the chain does not. On such a chain an implied link can itself be replaced
 * by what implies it, so all that are warned of can go together.
 */
final class ImpliedLinks {

  private final ReadCase read;
  private final Findings findings;

  private ImpliedLinks(ReadCase read, Findings findings) {
    this.read = read;
    this.findings = findings;
  }

  static void report(ReadCase read, Findings findings) {
    ImpliedLinks rule = new ImpliedLinks(read, findings);
    PlainChains chains = new PlainChains(read.reachable());
    for (int source = 0; source < read.network().size(); source++) {
      if (chains.layFrom(source)) {
        rule.report(chains);
      }
    }
  }

  /** The link in words. */
  static String named(ReadCase read, LinkRow link) {
    return read.activities().get(link.predecessor()).id()
        + " before "
        + read.activities().get(link.successor()).id();
  }

  private void report(PlainChains chains) {
    for (int index : chains.linksOutOfSource()) {
      Link link = read.network().link(index);
      boolean strongest = link.lag() == chains.longestDirectLag(link.successor());
      if (strongest && chains.reach(link.successor()) >= link.lag()) {
        LinkRow row = read.links().get(index);
        String chain = read.named(chains.to(link.successor()));
        String right = "it can go: the chain " + chain + " says as much";
        findings.warning(row.place().notice("implied by other links", named(read, row), right));
      }
    }
  }
}
