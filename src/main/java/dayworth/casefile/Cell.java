package dayworth.casefile;

import java.util.Optional;

/**
 * A cell that was read.
 *
 * @param text as it stands in the file, without spaces around it; empty where nothing is given
 * @param value empty where nothing is given or the text is faulty, which then has been reported
 */
record Cell<T>(String text, Optional<T> value) {

  /** Whether something stands there, right or wrong. */
  boolean given() {
    return !text.isEmpty();
  }

  /** Whether something stands there that could not be read. */
  boolean faulty() {
    return given() && value.isEmpty();
  }
}
