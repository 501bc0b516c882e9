package dayworth.report.brief.page;

import java.util.ArrayList;
import java.util.List;

/**
 * A document as Markdown with tables: the same text, its pictures told in words, without their
 * keys.
 */
public final class MarkdownPage {

  private final StringBuilder out = new StringBuilder();

  private MarkdownPage() {}

  /** The text, which ends with a line feed. */
  public static String of(Document document) {
    MarkdownPage page = new MarkdownPage();
    page.write(document);
    return page.out.toString();
  }

  private void write(Document document) {
    String reference = document.reference().isEmpty() ? "" : " (" + document.reference() + ")";
    block("# " + text(document.title() + reference));
    Document.Headline head = document.headline();
    block("**" + text((head.before() + head.stressed() + head.after()).strip()) + "**");
    document.sum().ifPresent(this::sum);
    document.lede().forEach(this::paragraph);
    table(
        List.of("", ""),
        List.of(false, false),
        document.facts().stream().map(fact -> List.of(fact.name(), fact.value())).toList());
    int number = 0;
    for (Section section : document.sections()) {
      block("## " + ++number + ". " + text(section.heading()));
      section.parts().forEach(this::part);
    }
    block("---");
    out.append(text(document.closing())).append('\n');
  }

  private void sum(Document.Sum sum) {
    line("- " + text(sum.from().amount() + " " + sum.from().meaning()));
    line("- less " + text(sum.less().amount() + " " + sum.less().meaning()));
    line("- leaves **" + text(sum.leaves().amount()) + "** " + text(sum.leaves().meaning()));
    line("");
  }

  private void part(Part part) {
    if (part instanceof Part.Prose prose) {
      prose.paragraphs().forEach(this::paragraph);
    } else if (part instanceof Part.Notes notes) {
      notes.paragraphs().forEach(this::paragraph);
    } else if (part instanceof Part.Live live) {
      paragraph(live.text());
    } else if (part instanceof Part.Beside beside) {
      beside.main().forEach(this::part);
      part(beside.remark());
    } else if (part instanceof Part.Remark remark) {
      remark.parts().forEach(this::part);
    } else if (part instanceof Part.Subheading heading) {
      block("### " + text(heading.text()));
    } else if (part instanceof Part.Statements statements) {
      statements.statements().forEach(this::statement);
      line("");
    } else if (part instanceof Part.Gap gap) {
      block("> **" + text(gap.title()) + "** " + text(gap.text()));
    } else if (part instanceof Part.Caution caution) {
      block("**" + text(caution.title()) + "** " + text(caution.text()));
    } else if (part instanceof Part.Claim claim) {
      paragraph(claim.text());
    } else if (part instanceof Part.Sheet sheet) {
      table(sheet.table());
    } else if (part instanceof Part.Figure figure) {
      picture(figure.picture());
    } else if (part instanceof Part.Drawn drawn) {
      table(drawn.table());
    } else if (part instanceof Part.Readout readout) {
      readout(readout);
    }
  }

  private void statement(Part.Statement statement) {
    String source = statement.source().isEmpty() ? "" : " (" + statement.source() + ")";
    line("- " + text(statement.text() + source));
  }

  private void picture(Picture picture) {
    block(
        "**"
            + text(picture.name())
            + ".** "
            + text(picture.caption() + " " + picture.description()));
  }

  private void readout(Part.Readout readout) {
    table(
        List.of("", ""),
        List.of(false, true),
        readout.lines().stream().map(line -> List.of(line.name(), line.amount())).toList());
    for (Part.Pick pick : readout.picks()) {
      String price = pick.price().isEmpty() ? "" : ", " + pick.price();
      line(
          "- **"
              + text(pick.id())
              + "** "
              + text(pick.name() + ": " + pick.tally().words() + price));
    }
    if (!readout.rest().isEmpty()) {
      line("- " + text(readout.rest()));
    }
    line("");
  }

  private void table(Table table) {
    block("**" + text(table.name()) + ".** " + text(table.caption()));
    List<List<String>> rows = new ArrayList<>();
    for (Table.Row row : table.rows()) {
      rows.add(row.cells().stream().map(Table.Cell::text).toList());
    }
    table(
        table.columns().stream().map(Table.Column::head).toList(),
        table.columns().stream().map(Table.Column::isFigure).toList(),
        rows);
  }

  private void table(List<String> heads, List<Boolean> figures, List<List<String>> rows) {
    row(heads);
    line("|" + String.join("|", figures.stream().map(f -> f ? " ---: " : " --- ").toList()) + "|");
    rows.forEach(this::row);
    line("");
  }

  private void row(List<String> cells) {
    line("| " + String.join(" | ", cells.stream().map(Escape::markdown).toList()) + " |");
  }

  private void paragraph(String paragraph) {
    block(text(paragraph));
  }

  private void block(String text) {
    line(text);
    line("");
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private static String text(String text) {
    return Escape.markdown(text);
  }
}
