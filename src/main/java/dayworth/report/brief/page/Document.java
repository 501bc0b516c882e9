package dayworth.report.brief.page;

import java.util.List;
import java.util.Optional;

/**
 * A paper: the answer first, then why.
 *
 * @param title what the paper is about
 * @param reference by which it is known; may be empty
 * @param headline the answer as one sentence
 * @param sum the answer as a sum; empty where nothing is weighed
 * @param lede what stands below it
 * @param facts who, when and on what basis
 * @param sections what follows, numbered from 1
 * @param closing how it was written
 */
public record Document(
    String title,
    String reference,
    Headline headline,
    Optional<Sum> sum,
    List<String> lede,
    List<Fact> facts,
    List<Section> sections,
    String closing) {

  public Document {
    lede = List.copyOf(lede);
    facts = List.copyOf(facts);
    sections = List.copyOf(sections);
  }

  /** A sentence of which one part is set off. */
  public record Headline(String before, String stressed, String after) {

    /** The sentence. */
    public String text() {
      return before + stressed + after;
    }
  }

  /** One amount less another leaves a third. */
  public record Sum(Addend from, Addend less, Addend leaves) {}

  /** An amount and what it is. */
  public record Addend(String amount, String meaning) {}

  /** Something known of the paper; what is not known is told as such. */
  public record Fact(String name, String value, boolean isKnown) {}
}
