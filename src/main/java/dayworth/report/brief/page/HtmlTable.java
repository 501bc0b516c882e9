package dayworth.report.brief.page;

/** Tables as HTML. */
final class HtmlTable {

  /** Letters of a chain that does not stay on one line. */
  private static final int LONG_CHAIN = 46;

  private final StringBuilder out;

  HtmlTable(StringBuilder out) {
    this.out = out;
  }

  /** A caption that stands above a picture and its table. */
  void caption(Table table) {
    line("<p class=\"cap\"><b>" + html(table.name()) + ".</b> " + html(table.caption()) + "</p>");
  }

  void write(Table table) {
    String wrap =
        switch (table.look()) {
          case SCROLLING ->
              "<div class=\"tw\" tabindex=\"0\" role=\"region\" aria-label=\""
                  + html(table.name())
                  + ", scrolls sideways on a narrow screen\">";
          case EVEN -> "";
          default -> "<div class=\"tw\">";
        };
    line(wrap + "<table role=\"table\" class=\"" + style(table) + "\">");
    String hidden = table.look() == Table.Look.EVEN ? " class=\"defs\"" : "";
    line(
        "<caption"
            + hidden
            + "><b>"
            + html(table.name())
            + ".</b> "
            + html(table.caption())
            + "</caption>");
    head(table);
    body(table);
    line("</table>" + (wrap.isEmpty() ? "" : "</div>"));
  }

  private static String style(Table table) {
    return switch (table.look()) {
      case STACKING -> "stack";
      case SCROLLING -> "long";
      case EVEN -> "cmp n" + (table.columns().size() - 1);
      case REASONS -> "stack why";
    };
  }

  private void head(Table table) {
    out.append("<thead role=\"rowgroup\"><tr role=\"row\">");
    for (int c = 0; c < table.columns().size(); c++) {
      Table.Column column = table.columns().get(c);
      if (column.head().isEmpty()) {
        out.append("<td role=\"cell\"></td>");
      } else {
        out.append("<th scope=\"col\" role=\"columnheader\"")
            .append(attribute(table, c))
            .append('>')
            .append(html(column.head()))
            .append("</th>");
      }
    }
    line("</tr></thead>");
  }

  private static String attribute(Table table, int column) {
    return switch (table.columns().get(column).content()) {
      case WORDS -> "";
      case FIGURES -> " class=\"r\"";
      case CHOSEN -> " class=\"pickcol\"";
    };
  }

  private void body(Table table) {
    line("<tbody role=\"rowgroup\">");
    for (Table.Row row : table.rows()) {
      String kind =
          switch (row.kind()) {
            case PLAIN -> "";
            case CHOSEN -> " class=\"pick\"";
            case QUIET -> " class=\"not\"";
            case SUM -> " class=\"sumrow\"";
          };
      out.append("<tr role=\"row\"").append(kind).append('>');
      for (int c = 0; c < row.cells().size(); c++) {
        cell(table, row, c);
      }
      line("</tr>");
    }
    line("</tbody>");
  }

  private void cell(Table table, Table.Row row, int column) {
    Table.Cell cell = row.cells().get(column);
    String style = attribute(table, column);
    if (column == 0) {
      out.append("<th scope=\"row\" role=\"rowheader\"").append(style).append('>');
    } else {
      String head = table.columns().get(column).head();
      String label = head.isEmpty() ? "" : " data-l=\"" + html(head) + "\"";
      out.append("<td role=\"cell\"").append(style).append(label).append('>');
    }
    content(cell);
    out.append(column == 0 ? "</th>" : "</td>");
  }

  private void content(Table.Cell cell) {
    if (cell instanceof Table.Named named) {
      out.append("<b>").append(html(named.id())).append("</b> ").append(html(named.name()));
    } else if (cell instanceof Table.Counted counted) {
      out.append(tally(counted.tally()));
    } else if (cell instanceof Table.AddUp sum) {
      addUp(sum);
    } else if (cell instanceof Table.Chains chains) {
      chains(chains);
    } else {
      out.append(html(cell.text()));
    }
  }

  static String tally(Part.Tally tally) {
    if (tally.marks() == 0) {
      return html(tally.words());
    }
    String mark = tally.isBack() ? "<i class=\"g\"></i>" : "<i></i>";
    return "<span class=\"tally\" aria-hidden=\"true\">"
        + mark.repeat(tally.marks())
        + "</span> "
        + html(tally.words());
  }

  private void addUp(Table.AddUp sum) {
    out.append("<span class=\"add\">");
    for (Table.Addend addend : sum.addends()) {
      out.append(addend.isBack() ? "<span class=\"back\">" : "<span>")
          .append(html(addend.name()))
          .append("</span><span class=\"r\">")
          .append(html(addend.amount()))
          .append("</span>");
    }
    out.append("<b></b><b class=\"r\">").append(html(sum.total())).append("</b></span>");
  }

  private void chains(Table.Chains chains) {
    for (Table.Chain chain : chains.chains()) {
      boolean isLong = chain.text().length() > LONG_CHAIN;
      out.append(isLong ? "<span class=\"chain long\">" : "<span class=\"chain\">");
      out.append("<span class=\"cn\">");
      out.append(html(chain.name())).append("</span>");
      chain.knots().forEach(this::knot);
      out.append("</span>");
    }
    if (!chains.rest().isEmpty()) {
      out.append("<span class=\"q\">").append(html(chains.rest())).append("</span>");
    }
  }

  private void knot(Table.Knot knot) {
    String id = html(knot.id());
    String hidden = "<span class=\"vh\">" + html(knot.change().suffix()) + "</span>";
    out.append(
        switch (knot.change()) {
          case NONE -> "<i>" + id + "</i>";
          case SHORTENED -> "<i><u>" + id + hidden + "</u></i>";
          case GIVEN_BACK -> "<i><s>" + id + hidden + "</s></i>";
        });
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private static String html(String text) {
    return Escape.html(text);
  }
}
