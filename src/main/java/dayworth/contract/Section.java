package dayworth.contract;

import java.time.LocalDate;
import java.util.Optional;

/**
 * A part of the work with a due time and money of its own.
 *
 * @param name for people
 * @param activity index of the activity whose finish completes the section
 * @param due by when the contract wants it
 * @param damages charged after that
 * @param bonus paid before that
 * @param done when it was finished, where it is
 */
public record Section(
    String name, int activity, Due due, Damages damages, Bonus bonus, Optional<Done> done) {

  /** A section that is to come. */
  public Section(String name, int activity, Due due, Damages damages, Bonus bonus) {
    this(name, activity, due, damages, bonus, Optional.empty());
  }

  /**
   * When a section was finished; its money is fixed.
   *
   * @param ticks 0 or below
   */
  public record Done(long ticks, LocalDate date) {}
}
