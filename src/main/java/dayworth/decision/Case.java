package dayworth.decision;

import dayworth.contract.MomentMoney;
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
 * @param terms what time is worth for the whole
 * @param momentMoney sections and running costs
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
    MomentMoney momentMoney,
    List<Notice> warnings,
    List<InputFile> inputs) {

  public Case {
    warnings = List.copyOf(warnings);
    inputs = List.copyOf(inputs);
  }

  /** A case without sections and running costs. */
  public Case(
      String name,
      String title,
      String currency,
      TimeUnit unit,
      Network network,
      Terms terms,
      List<Notice> warnings,
      List<InputFile> inputs) {
    this(
        name,
        title,
        currency,
        unit,
        network,
        terms,
        MomentMoney.none(network.scale()),
        warnings,
        inputs);
  }
}
