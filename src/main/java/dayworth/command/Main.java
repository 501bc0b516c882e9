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
    System.exit(run(arguments));
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
