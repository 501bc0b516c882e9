package dayworth.casefile;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dayworth.decision.Notes;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Each rule for notes.md. */
class NotesRulesTest {

  @TempDir private Path folder;

  private CaseOnDisk notes(String text) throws IOException {
    return new CaseOnDisk(folder)
        .with("activities.csv", CaseOnDisk.ONE_ACTIVITY)
        .with("notes.md", text);
  }

  @Test
  void paragraphsAndListsStandUnderTheirHeadings() throws IOException {
    Notes read =
        notes(
                """
                # What is asked

                Agree to an earlier
                finish.

                A second paragraph.

                ## WHAT WE NEED ##
                - The berth closed,
                  from Monday on.
                - An inspection
                1. A third thing
                And on it goes.

                After the list.

                # Assumptions
                * Dry weather
                """)
            .sound()
            .submission()
            .notes();
    assertEquals(
        List.of(
            new Notes.Paragraph("Agree to an earlier finish."),
            new Notes.Paragraph("A second paragraph.")),
        read.asked());
    assertEquals(
        List.of(
            new Notes.Items(
                List.of(
                    "The berth closed, from Monday on.",
                    "An inspection",
                    "A third thing And on it goes.")),
            new Notes.Paragraph("After the list.")),
        read.needs());
    assertEquals(List.of(new Notes.Items(List.of("Dry weather"))), read.assumptions());
  }

  @Test
  void anUnknownHeadingIsAWarningAndNothingBelowItIsRead() throws IOException {
    notes("# What we neeed\nthe berth\n\n# Assumptions\nDry weather\n");
    assertEquals(
        List.of(
            "notes.md:1 | no such heading | What we neeed | one of What is asked, What we need,"
                + " Assumptions; what follows it is left alone"),
        new CaseOnDisk(folder).warnings());
    Notes read = new CaseOnDisk(folder).sound().submission().notes();
    assertEquals(List.of(), read.needs());
    assertEquals(List.of(new Notes.Paragraph("Dry weather")), read.assumptions());
  }

  @Test
  void textBeforeTheFirstHeadingIsOneWarning() throws IOException {
    notes("\nTo the board\n\nMore\n# Assumptions\n");
    assertEquals(
        List.of(
            "notes.md:2 | text without a heading is left alone | To the board | one of the"
                + " headings before it: What is asked, What we need, Assumptions"),
        new CaseOnDisk(folder).warnings());
  }

  @Test
  void notesThatAreNotUtf8AreAProblem() throws IOException {
    notes("").with("notes.md", "# Assumptions\nna\u00efve\n".getBytes(StandardCharsets.ISO_8859_1));
    assertEquals(
        List.of("notes.md:2 | not UTF-8 |  | save it as UTF-8"), new CaseOnDisk(folder).problems());
  }

  @Test
  void noResultHangsOnNotes() throws IOException {
    assertEquals(
        List.of("activities.csv"),
        notes("# Assumptions\nDry weather\n").sound().inputs().stream()
            .map(input -> input.name())
            .toList());
  }
}
