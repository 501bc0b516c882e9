package dayworth.report.brief.page;

import java.util.List;

/**
 * A table.
 *
 * @param name such as Table 1
 * @param caption what it shows
 * @param columns from left to right; the first holds the headers of the rows
 * @param rows from top to bottom
 * @param look how it is laid out
 */
public record Table(String name, String caption, List<Column> columns, List<Row> rows, Look look) {

  public Table {
    columns = List.copyOf(columns);
    rows = List.copyOf(rows);
  }

  /** How a table is laid out. */
  public enum Look {
    /** On a narrow screen a row becomes a block. */
    STACKING,
    /** On a narrow screen it scrolls. */
    SCROLLING,
    /** Every column as wide as the next, below a picture. */
    EVEN,
    /** Steps with their reasons. */
    REASONS
  }

  /** A column. */
  public record Column(String head, Content content) {

    /** What stands in a column. */
    public enum Content {
      WORDS,
      /** Below each other to the right. */
      FIGURES,
      /** What belongs to the plan that is argued for. */
      CHOSEN
    }

    /** A column of words. */
    public static Column words(String head) {
      return new Column(head, Content.WORDS);
    }

    /** A column of figures. */
    public static Column figures(String head) {
      return new Column(head, Content.FIGURES);
    }

    boolean isFigure() {
      return content == Content.FIGURES;
    }
  }

  /** A row. */
  public record Row(Kind kind, List<Cell> cells) {

    public Row {
      cells = List.copyOf(cells);
    }

    /** What a row is. */
    public enum Kind {
      PLAIN,
      /** The one that is argued for. */
      CHOSEN,
      /** What is not done. */
      QUIET,
      /** A sum of those above. */
      SUM
    }
  }

  /** What stands in a cell. */
  public sealed interface Cell {

    /** The same as plain text. */
    String text();

    /** An empty cell. */
    static Cell blank() {
      return new Words("");
    }

    /** Some words. */
    static Cell of(String text) {
      return new Words(text);
    }
  }

  /** Some words. */
  public record Words(String text) implements Cell {}

  /** Something with its id and its name, which may be empty. */
  public record Named(String id, String name) implements Cell {
    @Override
    public String text() {
      return name.isEmpty() ? id : id + " " + name;
    }
  }

  /** Units as marks and in words. */
  public record Counted(Part.Tally tally) implements Cell {
    @Override
    public String text() {
      return tally.words();
    }
  }

  /** Amounts that add up. */
  public record AddUp(List<Addend> addends, String total) implements Cell {

    public AddUp {
      addends = List.copyOf(addends);
    }

    @Override
    public String text() {
      return String.join(
              " + ", addends.stream().map(one -> one.name() + " " + one.amount()).toList())
          + " = "
          + total;
    }
  }

  /** One of the amounts; what is given back is told apart. */
  public record Addend(String name, String amount, boolean isBack) {}

  /** Chains of activities. */
  public record Chains(List<Chain> chains, String rest) implements Cell {

    public Chains {
      chains = List.copyOf(chains);
    }

    @Override
    public String text() {
      String all = String.join("; ", chains.stream().map(Chain::text).toList());
      return rest.isEmpty() ? all : all + "; " + rest;
    }
  }

  /** A named chain. */
  public record Chain(String name, List<Knot> knots) {

    public Chain {
      knots = List.copyOf(knots);
    }

    String text() {
      return name + ": " + String.join(", ", knots.stream().map(Knot::text).toList());
    }
  }

  /** An activity on a chain. */
  public record Knot(String id, Change change) {

    String text() {
      return id + change.suffix();
    }

    /** What is done to it. */
    public enum Change {
      NONE(""),
      SHORTENED(" (shortened)"),
      GIVEN_BACK(" (given back)");

      private final String suffix;

      Change(String suffix) {
        this.suffix = suffix;
      }

      String suffix() {
        return suffix;
      }
    }
  }
}
