package dayworth.report.brief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dayworth.decision.BriefAnswer;
import dayworth.report.CurveFiles;
import java.io.IOException;
import java.io.InputStream;
import java.io.StringReader;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.openqa.selenium.logging.LogType;

/** The page as a reader has it, in a real browser. */
class BrowserTest {

  @TempDir private static Path folder;

  private static Browser browser;
  private static BriefAnswer ferry;
  private static Path ferryPage;

  @BeforeAll
  static void start() throws IOException {
    browser = Browser.start();
    ferry = Briefs.of(Briefs.FERRY_LANDING);
    ferryPage = page("ferry", ferry);
  }

  @AfterAll
  static void stop() {
    if (browser != null) {
      browser.close();
    }
  }

  @BeforeEach
  void asUsual() {
    browser.scripts(true);
    browser.width(1180);
    browser.scheme("light");
    browser.log(LogType.BROWSER);
    browser.log(LogType.PERFORMANCE);
  }

  private static Path page(String name, BriefAnswer answer) throws IOException {
    return Files.writeString(folder.resolve(name + ".html"), Briefs.html(answer));
  }

  /** Each is computed once. */
  private static Path demo(String name) throws IOException {
    Path page = folder.resolve(name + ".html");
    return Files.exists(page) ? page : page(name, Briefs.of(Path.of("cases", name)));
  }

  private static void press(String key) {
    browser.run(
        "document.getElementById('finish').dispatchEvent("
            + "new KeyboardEvent('keydown', {key: arguments[0], bubbles: true, cancelable: true}));",
        key);
    browser.settle();
  }

  private static BigDecimal amount(String id) {
    String figures = browser.text(id).replaceAll("[^0-9.−]", "").replace("−", "-");
    return new BigDecimal(figures).setScale(2);
  }

  private static List<CSVRecord> curve(BriefAnswer answer) throws IOException {
    String text =
        new String(CurveFiles.of(answer.curve(), "test").get("curve.csv"), StandardCharsets.UTF_8);
    return CSVFormat.RFC4180
        .builder()
        .setHeader()
        .setSkipHeaderRecord(true)
        .get()
        .parse(new StringReader(text))
        .getRecords();
  }

  @Test
  void theSliderShowsTheFiguresOfEveryRow() throws IOException {
    browser.open(ferryPage);
    List<CSVRecord> rows = curve(ferry);
    BigDecimal planned = ferry.curve().asPlanned().direct().cents();
    BigDecimal carryOn = ferry.curve().asPlanned().total();
    press("Home");
    for (CSVRecord row : rows) {
      String days = row.get("duration");
      assertEquals(days + " days", browser.text("now-d"));
      BigDecimal total = new BigDecimal(row.get("total_cost"));
      assertEquals(
          new BigDecimal(row.get("direct_cost")).subtract(planned), amount("v-extra"), days);
      assertEquals(new BigDecimal(row.get("time_related_cost")), amount("v-time"), days);
      assertEquals(new BigDecimal(row.get("damages")), amount("v-dam"), days);
      assertEquals(new BigDecimal(row.get("bonus")).negate(), amount("v-bonus"), days);
      assertEquals(total.subtract(planned), amount("v-total"), days);
      assertEquals(total.subtract(carryOn), amount("v-diff"), days);
      String spoken =
          String.valueOf(
              browser.run(
                  "return document.getElementById('finish').getAttribute('aria-valuetext');"));
      assertTrue(spoken.startsWith(days + " working days, "), spoken);
      assertTrue(spoken.endsWith("total " + browser.text("v-total")), spoken);
      press("ArrowRight");
    }
    assertEquals(16, rows.size());
  }

  @Test
  void aDragAndTheButtonsMoveIt() {
    browser.open(ferryPage);
    browser.run(
        "var s = document.getElementById('finish'); s.value = 3;"
            + "s.dispatchEvent(new Event('input', {bubbles: true}));");
    browser.settle();
    assertEquals("60 days", browser.text("now-d"));
    browser.run("document.getElementById('sooner').click();");
    assertEquals("59 days", browser.text("now-d"));
    browser.run("document.getElementById('later').click();");
    assertEquals("60 days", browser.text("now-d"));
    assertEquals("#finish=60", browser.run("return location.hash;"));
  }

  @Test
  void aLinkLeadsToItsFinish() {
    browser.open(ferryPage, "finish=53");
    assertEquals("At 53 working days, Wednesday 18 November 2026", browser.text("try-h"));
    browser.run("location.hash = '#finish=48';");
    browser.settle();
    assertEquals("At 48 working days, Wednesday 11 November 2026", browser.text("try-h"));
    browser.run("location.hash = '#finish=1e9<b>';");
    browser.settle();
    assertEquals("At 48 working days, Wednesday 11 November 2026", browser.text("try-h"));
  }

  /** What the page's script draws is what the program drew, for every mark and word. */
  @ParameterizedTest
  @ValueSource(
      strings = {"ferry-berth", "ferry-berth-core", "ferry-berth-status", "outage", "starter"})
  void theNetworkFollowsAndComesBackTheSame(String name) throws IOException {
    browser.open(demo(name));
    String marks =
        "return Array.from(document.querySelectorAll('#net-moving > *')).map(function (e) {"
            + "return [e.tagName, e.getAttribute('class') || '', e.textContent,"
            + "Array.from(e.attributes).filter(function (a) { return a.name !== 'class'; })"
            + ".map(function (a) { return a.name + '=' + a.value; }).sort().join(' ')].join('|');"
            + "});";
    List<?> drawn = (List<?>) browser.run(marks);
    String chosen = browser.text("now-d");
    press("ArrowLeft");
    List<?> other = (List<?>) browser.run(marks);
    assertFalse(drawn.equals(other), "the network follows the slider");
    press("ArrowRight");
    assertEquals(chosen, browser.text("now-d"));
    List<?> again = (List<?>) browser.run(marks);
    assertEquals(drawn.size(), again.size());
    for (int i = 0; i < drawn.size(); i++) {
      assertSameMark(drawn.get(i).toString(), again.get(i).toString());
    }
  }

  private static final Pattern NUMBER = Pattern.compile("-?\\d+(\\.\\d+)?");

  /** The same but for a tenth of a pixel or two, by which a browser measures words otherwise. */
  private static void assertSameMark(String drawn, String again) {
    assertEquals(
        NUMBER.matcher(drawn.substring(drawn.lastIndexOf('|'))).replaceAll("#"),
        NUMBER.matcher(again.substring(again.lastIndexOf('|'))).replaceAll("#"),
        drawn);
    assertEquals(
        drawn.substring(0, drawn.lastIndexOf('|')), again.substring(0, again.lastIndexOf('|')));
    Matcher one = NUMBER.matcher(drawn);
    Matcher other = NUMBER.matcher(again);
    while (one.find() && other.find()) {
      assertEquals(Double.parseDouble(one.group()), Double.parseDouble(other.group()), 0.25, drawn);
    }
  }

  @Test
  void withoutScriptsTheDocumentStands() {
    browser.scripts(false);
    browser.open(ferryPage);
    browser.scripts(true);
    String shown =
        "return Array.from(document.querySelectorAll(arguments[0])).filter(function (e) {"
            + "return e.getClientRects().length > 0; }).length;";
    assertEquals(0L, browser.run(shown, ".bar"));
    assertEquals(1L, browser.run(shown, "h1"));
    assertEquals(10L, browser.run(shown, "section"));
    assertTrue((Long) browser.run(shown, "table") >= 6);
    assertTrue((Long) browser.run(shown, "svg[role=img]") >= 5);
    assertEquals("€190,810", browser.text("v-total"));
  }

  @Test
  void hostileNamesStayText() throws IOException {
    Path hostile = Files.createDirectories(folder.resolve("hostile"));
    Files.writeString(
        hostile.resolve("activities.csv"),
        "id,name,group,normal_duration,normal_cost,crash_duration,crash_cost,predecessors\n"
            + "<img src=x onerror=bad()>,</script><script>bad()</script>,\"\"\"><svg"
            + " onload=bad()>\",5,100,3,300,\n"
            + "b&amp'\"\"`${bad()},\u202Eevil\u2066 \u05E9\u05DC\u05D5\u05DD,<!--,4,100,2,200,<img"
            + " src=x onerror=bad()>\n");
    Files.writeString(
        hostile.resolve("terms.csv"),
        "term,value\ntitle,</title><script>bad()</script>\ncurrency,<b>\ntime_related_cost,150\n"
            + "prepared_for,<style>*{display:none}</style>\nreference,\"\"\"}@import url(x)\"\n");
    Files.writeString(hostile.resolve("notes.md"), "# Assumptions\n- <iframe src=x></iframe>\n");
    browser.open(page("hostile", Briefs.of(hostile)));
    assertEquals(2L, browser.run("return document.scripts.length;"));
    assertEquals(
        0L, browser.run("return document.querySelectorAll('img,iframe,b b,[onload]').length;"));
    assertEquals(1L, browser.run("return document.querySelectorAll('style').length;"));
    String page = String.valueOf(browser.run("return document.body.innerText;"));
    for (String text :
        new String[] {
          "<img src=x onerror=bad()>",
          "</script><script>bad()</script>",
          "<iframe src=x></iframe>",
          "<style>*{display:none}</style>"
        }) {
      assertTrue(page.contains(text), text);
    }
    assertFalse(page.contains("\u202E"), "nothing turns the reading");
    press("Home");
    press("End");
    assertEquals(List.of(), errors());
  }

  private static List<String> errors() {
    return browser.log(LogType.BROWSER).stream().filter(line -> !line.contains("favicon")).toList();
  }

  @Test
  void nothingIsRequestedAndNothingIsComplainedOf() {
    browser.open(ferryPage);
    press("Home");
    press("End");
    assertEquals(List.of(), errors());
    Pattern url = Pattern.compile("\"url\":\"([^\"]*)\"");
    long left = 0;
    for (String line : browser.log(LogType.PERFORMANCE)) {
      if (line.contains("Network.requestWillBeSent\"")) {
        Matcher found = url.matcher(line);
        while (found.find()) {
          boolean own =
              found.group(1).startsWith("data:")
                  || found.group(1).startsWith(ferryPage.toUri().toString());
          assertTrue(own, found.group(1));
          left++;
        }
      }
    }
    assertTrue(left > 0, "the page itself was seen to be loaded");
  }

  @ParameterizedTest
  @ValueSource(strings = {"light", "dark", "narrow"})
  void noRuleOfAccessibilityIsBroken(String way) throws IOException {
    browser.scheme(way.equals("dark") ? "dark" : "light");
    browser.width(way.equals("narrow") ? 390 : 1180);
    for (Path page : List.of(ferryPage, demo("ferry-berth-status"))) {
      browser.open(page);
      browser.run(axe());
      Object broken =
          browser.await(
              "var done = arguments[0]; axe.run(document, {resultTypes: ['violations'], runOnly:"
                  + " ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']})"
                  + ".then(function (r) { done(r.violations.map(function (v) { return v.id + ': ' +"
                  + " v.nodes.slice(0, 3).map(function (n) { return n.html.slice(0, 160) + ' ' +"
                  + " n.failureSummary; }).join(' // '); })); });");
      assertEquals(List.of(), broken, page.getFileName().toString());
    }
  }

  private static String axe() throws IOException {
    try (InputStream script = BrowserTest.class.getResourceAsStream("/axe.min.js")) {
      return new String(script.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  /** No label stands on another, at any of some finishes. */
  @ParameterizedTest
  @ValueSource(
      strings = {"ferry-berth", "ferry-berth-core", "ferry-berth-status", "outage", "starter"})
  void noLabelStandsOnAnother(String name) throws IOException {
    Path page = demo(name);
    for (int width : new int[] {1180, 390}) {
      browser.width(width);
      browser.open(page);
      assertEquals(List.of(), browser.run(OVERLAPS), name + " at " + width);
      press("Home");
      assertEquals(List.of(), browser.run(OVERLAPS), name + " at " + width + ", longest");
      press("End");
      assertEquals(List.of(), browser.run(OVERLAPS), name + " at " + width + ", shortest");
      assertEquals(
          true,
          browser.run("return document.documentElement.scrollWidth <= window.innerWidth;"),
          name + " is no wider than the screen");
    }
  }

  private static final String OVERLAPS =
      "var bad = [];"
          + "document.querySelectorAll('svg').forEach(function (svg) {"
          + "  if (svg.ownerSVGElement || !svg.getClientRects().length) return;"
          + "  var all = Array.from(svg.querySelectorAll('text')).map(function (t) {"
          + "    return [t.getBoundingClientRect(), t.textContent]; });"
          + "  all.forEach(function (a, i) { all.slice(i + 1).forEach(function (b) {"
          + "    var w = Math.min(a[0].right, b[0].right) - Math.max(a[0].left, b[0].left);"
          + "    var h = Math.min(a[0].bottom, b[0].bottom) - Math.max(a[0].top, b[0].top);"
          + "    if (w > 1 && h > 4) bad.push(a[1] + ' | ' + b[1]); }); }); });"
          + "return bad;";

  @ParameterizedTest
  @ValueSource(strings = {"A4", "Letter"})
  void itPrintsOnWholePages(String paper) throws IOException {
    double width = paper.equals("A4") ? 8.27 : 8.5;
    double height = paper.equals("A4") ? 11.69 : 11;
    browser.open(demo("ferry-berth-core"));
    Map<String, Object> printed =
        browser.command(
            "Page.printToPDF",
            Map.of(
                "paperWidth",
                width,
                "paperHeight",
                height,
                "printBackground",
                true,
                "preferCSSPageSize",
                false));
    String pdf =
        new String(
            Base64.getDecoder().decode(String.valueOf(printed.get("data"))),
            StandardCharsets.ISO_8859_1);
    Matcher boxes = Pattern.compile("/MediaBox ?\\[ ?0 0 ([0-9.]+) ([0-9.]+) ?\\]").matcher(pdf);
    int upright = 0;
    int broad = 0;
    while (boxes.find()) {
      double w = Double.parseDouble(boxes.group(1)) / 72;
      double h = Double.parseDouble(boxes.group(2)) / 72;
      assertEquals(Math.min(width, height), Math.min(w, h), 0.02);
      assertEquals(Math.max(width, height), Math.max(w, h), 0.02);
      upright += h > w ? 1 : 0;
      broad += w > h ? 1 : 0;
    }
    assertTrue(upright >= 6 && upright <= 20, "upright pages: " + upright);
    assertTrue(broad >= 1 && broad <= 6, "broad pages for the network: " + broad);
  }
}
