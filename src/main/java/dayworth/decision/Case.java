package dayworth.decision;

import dayworth.contract.Due;
import dayworth.contract.Terms;
import dayworth.network.Network;
import java.util.List;

/**
 * A case that was read and found sound.
 *
 * @param name the case folder's name
 * @param title for people; may be empty
 * @param currency an ISO 4217 code or a symbol; may be empty
 * @param unit what a duration of one means
 * @param warnings doubtful input, sorted; they stand in every result
 * @param inputs the files it was read from, sorted by name
 */
public record Case(
    String name,
    String title,
    String currency,
    TimeUnit unit,
    Network network,
    Terms terms,
    List<Notice> warnings,
    List<InputFile> inputs) {

  public Case {
    warnings = List.copyOf(warnings);
    inputs = List.copyOf(inputs);
  }

  /** The same case under another contract finish. */
  public Case dueBy(Due due) {
    return new Case(name, title, currency, unit, network, terms.dueBy(due), warnings, inputs);
  }
}
