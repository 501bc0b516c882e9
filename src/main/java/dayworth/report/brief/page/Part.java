package dayworth.report.brief.page;

import java.util.List;

/** A piece of a section. */
public sealed interface Part {

  /** Paragraphs of a text that is read. */
  record Prose(List<String> paragraphs) implements Part {
    public Prose {
      paragraphs = List.copyOf(paragraphs);
    }
  }

  /** What is looked at beside what explains it. */
  record Beside(List<Part> main, Remark remark) implements Part {
    public Beside {
      main = List.copyOf(main);
    }
  }

  /**
   * An explanation beside something.
   *
   * @param label what it is about, for those who do not see it
   */
  record Remark(String label, List<Part> parts) implements Part {
    public Remark {
      parts = List.copyOf(parts);
    }
  }

  /** Short paragraphs of an explanation. */
  record Notes(List<String> paragraphs) implements Part {
    public Notes {
      paragraphs = List.copyOf(paragraphs);
    }
  }

  /** A short paragraph that the slider changes. */
  record Live(String id, String text) implements Part {}

  /** The marks of a picture with what they mean. */
  record Key(List<Mark> marks) implements Part {
    public Key {
      marks = List.copyOf(marks);
    }
  }

  /** A drawn mark and what it means. */
  record Mark(String svg, String meaning) {}

  /** A smaller heading. */
  record Subheading(String text) implements Part {}

  /** Statements, each with where it comes from. */
  record Statements(List<Statement> statements) implements Part {
    public Statements {
      statements = List.copyOf(statements);
    }
  }

  /** A statement and where it comes from; the source may be empty. */
  record Statement(String text, String source) {}

  /** What a case does not have. */
  record Gap(String title, String text) implements Part {}

  /** A warning with a word before it. */
  record Caution(String title, String text) implements Part {}

  /** A sentence that is set larger. */
  record Claim(String text) implements Part {}

  /** A table. */
  record Sheet(Table table) implements Part {}

  /** A picture. */
  record Figure(Picture picture) implements Part {}

  /** A picture and the table that says the same, column below column. */
  record Drawn(Picture picture, Table table) implements Part {}

  /**
   * What the slider changes, as it stands for the chosen finish.
   *
   * @param lines money, summed up
   * @param picks what is shortened
   * @param jumps finishes to go to
   */
  record Readout(List<Amount> lines, List<Pick> picks, String rest, List<Jump> jumps)
      implements Part {
    public Readout {
      lines = List.copyOf(lines);
      picks = List.copyOf(picks);
      jumps = List.copyOf(jumps);
    }
  }

  /** A line of the sum. */
  record Amount(String id, String name, String amount, Weight weight) {}

  /** How much a line of the sum weighs. */
  enum Weight {
    PLAIN,
    TOTAL,
    DIFFERENCE
  }

  /** Something that is shortened or given back. */
  record Pick(String id, String name, Tally tally, String price) {}

  /** Units as marks, as far as there is room for them, and in words. */
  record Tally(int marks, boolean isBack, String words) {}

  /** A link to a finish. */
  record Jump(String name, String fragment) {}
}
