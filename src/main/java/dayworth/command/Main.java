package dayworth.command;

import java.io.PrintWriter;
import java.nio.charset.Charset;
import picocli.CommandLine;

/** The program {@code dayworth}. */
public final class Main {

  private Main() {}

  public static void main(String[] arguments) {
    // Pictures are painted into files; a screen is neither needed nor looked for.
    System.setProperty("java.awt.headless", "true");
    System.exit(runSafely(arguments));
  }

  /** Want of memory or of the runtime's own parts is no exception, and still no stack trace. */
  private static int runSafely(String... arguments) {
    try {
      return run(arguments);
    } catch (OutOfMemoryError failure) {
      System.err.println(
          "dayworth: the case needs more memory: start it with java -Xmx4g -jar ...");
      return Exit.INTERNAL;
    } catch (Error failure) {
      System.err.println(
          "dayworth: the Java runtime fails: " + failure + ". Try --no-pictures, or another JDK.");
      return Exit.INTERNAL;
    }
  }

  static int run(String... arguments) {
    CommandLine line = new CommandLine(new Dayworth());
    Charset charset = Charset.defaultCharset();
    line.setOut(new PrintWriter(System.out, true, charset));
    line.setErr(new PrintWriter(System.err, true, charset));
    line.setExecutionExceptionHandler(
        (failure, command, parsed) -> {
          command
              .getErr()
              .println("dayworth: an internal error: " + failure + ". Nothing was written.");
          return Exit.INTERNAL;
        });
    return line.execute(arguments);
  }
}
