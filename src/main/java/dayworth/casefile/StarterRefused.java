package dayworth.casefile;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Path;

/** A case to start from was not written, and nothing was changed; the message is for people. */
public final class StarterRefused extends Exception {

  private static final long serialVersionUID = 1L;

  StarterRefused(String sentence) {
    super(sentence);
  }

  private StarterRefused(String sentence, IOException cause) {
    super(sentence, cause);
  }

  static StarterRefused because(Path folder, IOException failure) {
    return new StarterRefused(
        folder + " could not be written: " + reason(failure) + ". Nothing was left there.",
        failure);
  }

  private static String reason(IOException failure) {
    if (failure instanceof AccessDeniedException denied) {
      return "no permission for " + denied.getFile();
    }
    String reason = failure instanceof FileSystemException system ? system.getReason() : null;
    return reason == null ? String.valueOf(failure.getMessage()) : reason;
  }
}
