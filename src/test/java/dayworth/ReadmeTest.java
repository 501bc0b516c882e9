package dayworth;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.tools.JavaCompiler;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What the pages promise: the example compiles and prints what they say, and links lead somewhere.
 */
class ReadmeTest {

  private static final Path README = Path.of("README.md");
  private static final Pattern JAVA = Pattern.compile("```java\n(.*?)```", Pattern.DOTALL);
  private static final Pattern PRINTS =
      Pattern.compile("It prints\n\n```\n(.*?)```", Pattern.DOTALL);
  private static final Pattern LINK = Pattern.compile("\\]\\(([^)#]+)\\)");

  @Test
  void theJavaExampleCompilesAndPrintsWhatIsSaid(@TempDir Path folder) throws Exception {
    String page = Files.readString(README);
    Path source = folder.resolve("Example.java");
    Files.writeString(source, found(JAVA, page));
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    int status =
        compiler.run(
            null,
            null,
            null,
            "-cp",
            System.getProperty("java.class.path"),
            "-proc:none",
            "-d",
            folder.toString(),
            source.toString());
    assertEquals(0, status);
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                folder
                    + System.getProperty("path.separator")
                    + System.getProperty("java.class.path"),
                "Example")
            .redirectErrorStream(true)
            .start();
    ByteArrayOutputStream printed = new ByteArrayOutputStream();
    process.getInputStream().transferTo(new PrintStream(printed, true, StandardCharsets.UTF_8));
    assertEquals(0, process.waitFor());
    assertEquals(found(PRINTS, page), printed.toString(StandardCharsets.UTF_8));
  }

  @Test
  void everyLinkToAFileLeadsToOne() throws IOException {
    List<String> broken = new ArrayList<>();
    for (Path page : pages()) {
      Matcher links = LINK.matcher(Files.readString(page));
      while (links.find()) {
        String target = links.group(1);
        if (!target.contains("://") && !Files.exists(page.resolveSibling(target))) {
          broken.add(page + " to " + target);
        }
      }
    }
    assertEquals(List.of(), broken);
  }

  private static List<Path> pages() throws IOException {
    try (Stream<Path> top = Files.list(Path.of(""))) {
      List<Path> pages =
          new ArrayList<>(top.filter(path -> path.toString().endsWith(".md")).sorted().toList());
      pages.add(Path.of("cases", "README.md"));
      pages.add(Path.of("output", "README.md"));
      return pages;
    }
  }

  private static String found(Pattern pattern, String page) {
    Matcher matcher = pattern.matcher(page);
    assertTrue(matcher.find(), "the page has " + pattern);
    return matcher.group(1);
  }
}
