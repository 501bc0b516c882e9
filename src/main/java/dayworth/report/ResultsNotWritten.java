package dayworth.report;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Path;
import java.util.Locale;

/** Results could not be written; the message is a plain sentence for people. */
public final class ResultsNotWritten extends Exception {

  private static final long serialVersionUID = 1L;

  ResultsNotWritten(String sentence) {
    super(sentence);
  }

  private ResultsNotWritten(String sentence, IOException cause) {
    super(sentence, cause);
  }

  /**
   * The sentence for a failure.
   *
   * @param state what that leaves in the folder
   */
  static ResultsNotWritten because(Path folder, IOException failure, String state) {
    return new ResultsNotWritten(
        "Results could not be written to " + folder + ": " + reason(failure) + "; " + state + ".",
        failure);
  }

  private static String reason(IOException failure) {
    if (failure instanceof AccessDeniedException denied) {
      return "no permission for " + denied.getFile();
    }
    String text = failure instanceof FileSystemException system ? system.getReason() : null;
    if (text == null) {
      text = String.valueOf(failure.getMessage());
    }
    return text.toLowerCase(Locale.ROOT).contains("no space left") ? "the disk is full" : text;
  }
}
