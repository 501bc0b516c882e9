package dayworth.contract;

/**
 * A part of the work with a due time and money of its own.
 *
 * @param name for people
 * @param activity index of the activity whose finish completes the section
 * @param due by when the contract wants it
 * @param damages charged after that
 * @param bonus paid before that
 */
public record Section(String name, int activity, Due due, Damages damages, Bonus bonus) {}
