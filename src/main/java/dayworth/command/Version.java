package dayworth.command;

import java.util.Optional;
import picocli.CommandLine.IVersionProvider;

/** The program's version, from the jar's manifest. */
final class Version implements IVersionProvider {

  static String text() {
    return Optional.ofNullable(Version.class.getPackage().getImplementationVersion())
        .orElse("development");
  }

  @Override
  public String[] getVersion() {
    return new String[] {"dayworth " + text()};
  }
}
