package dayworth.casefile;

import dayworth.decision.Notes;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads notes.md: plain paragraphs and lists under three headings. Marks within a line, such as
 * those for bold, are not looked at.
 */
final class NotesText {

  static final String FILE = "notes.md";

  private static final List<String> HEADINGS =
      List.of("What is asked", "What we need", "Assumptions");

  private static final Pattern HEADING = Pattern.compile("#{1,6}\\s+(.*?)\\s*#*");
  private static final Pattern ITEM = Pattern.compile("(?:[-*+]|\\d{1,3}[.)])\\s+(.*)");

  private final Findings findings;
  private final Map<String, List<Notes.Passage>> passages = new LinkedHashMap<>();
  private Optional<String> heading = Optional.empty();

  /** Lines of the paragraph or the item that is being read. */
  private final List<String> lines = new ArrayList<>();

  private final List<String> items = new ArrayList<>();
  private boolean inItem;
  private boolean strayTold;

  private NotesText(Findings findings) {
    this.findings = findings;
    HEADINGS.forEach(name -> passages.put(name, new ArrayList<>()));
  }

  static Notes read(String text, Findings findings) {
    NotesText notes = new NotesText(findings);
    int number = 0;
    for (String line : text.lines().toList()) {
      notes.line(line.strip(), ++number);
    }
    notes.endList();
    return new Notes(
        notes.passages.get(HEADINGS.get(0)),
        notes.passages.get(HEADINGS.get(1)),
        notes.passages.get(HEADINGS.get(2)));
  }

  private void line(String line, int number) {
    Matcher head = HEADING.matcher(line);
    Matcher item = ITEM.matcher(line);
    if (head.matches()) {
      endList();
      begin(head.group(1), number);
    } else if (line.isEmpty()) {
      endText();
    } else if (heading.isEmpty()) {
      stray(line, number);
    } else if (item.matches()) {
      endText();
      inItem = true;
      lines.add(item.group(1));
    } else {
      if (lines.isEmpty()) {
        endList();
      }
      lines.add(line);
    }
  }

  private void begin(String title, int number) {
    heading = HEADINGS.stream().filter(title::equalsIgnoreCase).findFirst();
    strayTold = heading.isEmpty();
    if (heading.isEmpty()) {
      String right = "one of " + String.join(", ", HEADINGS) + "; what follows it is left alone";
      findings.warning(new Place(FILE, number, "").notice("no such heading", title, right));
    }
  }

  private void stray(String line, int number) {
    if (!strayTold) {
      strayTold = true;
      String right = "one of the headings before it: " + String.join(", ", HEADINGS);
      findings.warning(
          new Place(FILE, number, "").notice("text without a heading is left alone", line, right));
    }
  }

  private void endText() {
    if (lines.isEmpty()) {
      return;
    }
    String text = String.join(" ", lines);
    lines.clear();
    if (inItem) {
      items.add(text);
      inItem = false;
    } else {
      passages.get(heading.orElseThrow()).add(new Notes.Paragraph(text));
    }
  }

  private void endList() {
    endText();
    if (!items.isEmpty()) {
      passages.get(heading.orElseThrow()).add(new Notes.Items(items));
      items.clear();
    }
  }
}
