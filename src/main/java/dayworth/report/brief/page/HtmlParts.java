package dayworth.report.brief.page;

/** The pieces of a section as HTML. */
final class HtmlParts {

  private final StringBuilder out;
  private final HtmlTable tables;
  private int pictures;

  HtmlParts(StringBuilder out) {
    this.out = out;
    this.tables = new HtmlTable(out);
  }

  void write(Part part) {
    if (part instanceof Part.Prose prose) {
      line("<div class=\"prose\">");
      prose.paragraphs().forEach(text -> line("<p>" + html(text) + "</p>"));
      line("</div>");
    } else if (part instanceof Part.Notes notes) {
      notes.paragraphs().forEach(text -> line("<p>" + html(text) + "</p>"));
    } else if (part instanceof Part.Live live) {
      line("<p id=\"" + live.id() + "\">" + html(live.text()) + "</p>");
      line(
          "<p class=\"js-only\">Move the slider, or use the arrow keys: the column in the pictures"
              + " above, the network below and these figures follow. The address of the page keeps"
              + " the finish that you choose.</p>");
    } else if (part instanceof Part.Beside beside) {
      beside(beside);
    } else if (part instanceof Part.Remark remark) {
      remark(remark);
    } else if (part instanceof Part.Key key) {
      key(key);
    } else if (part instanceof Part.Subheading heading) {
      line("<h3>" + html(heading.text()) + "</h3>");
    } else if (part instanceof Part.Statements statements) {
      statements(statements);
    } else if (part instanceof Part.Gap gap) {
      line(
          "<div class=\"gap\" role=\"note\"><b>"
              + html(gap.title())
              + "</b> "
              + html(gap.text())
              + "</div>");
    } else if (part instanceof Part.Caution caution) {
      line("<p><b>" + html(caution.title()) + "</b> " + html(caution.text()) + "</p>");
    } else if (part instanceof Part.Claim claim) {
      line("<p class=\"proofline\">" + html(claim.text()) + "</p>");
    } else if (part instanceof Part.Sheet sheet) {
      tables.write(sheet.table());
    } else if (part instanceof Part.Figure figure) {
      figure(figure.picture());
    } else if (part instanceof Part.Drawn drawn) {
      drawn(drawn);
    } else if (part instanceof Part.Readout readout) {
      readout(readout);
    }
  }

  private void beside(Part.Beside beside) {
    line("<div class=\"cols\"><div class=\"main\">");
    beside.main().forEach(this::write);
    line("</div>");
    write(beside.remark());
    line("</div>");
  }

  private void remark(Part.Remark remark) {
    line("<div class=\"note\" role=\"note\" aria-label=\"" + html(remark.label()) + "\">");
    remark.parts().forEach(this::write);
    line("</div>");
  }

  private void key(Part.Key key) {
    for (Part.Mark mark : key.marks()) {
      line(
          "<div class=\"k\"><svg viewBox=\"0 0 30 20\" aria-hidden=\"true\">"
              + mark.svg()
              + "</svg><span>"
              + html(mark.meaning())
              + "</span></div>");
    }
  }

  private void statements(Part.Statements statements) {
    line("<ul class=\"lines\">");
    for (Part.Statement statement : statements.statements()) {
      String source =
          statement.source().isEmpty()
              ? ""
              : "<span class=\"src\">" + html(statement.source()) + "</span>";
      line("<li>" + html(statement.text()) + source + "</li>");
    }
    line("</ul>");
  }

  private void figure(Picture picture) {
    line("<figure>");
    line(
        "<figcaption><b>"
            + html(picture.name())
            + ".</b> "
            + html(picture.caption())
            + "</figcaption>");
    drawings(picture);
    line("</figure>");
  }

  /** The words of a picture stand in it once for each drawing, for only one is ever shown. */
  private void drawings(Picture picture) {
    boolean scrolls = picture.drawings().get(0).use() == Picture.Use.ALWAYS;
    if (scrolls) {
      line(
          "<div class=\"netwrap"
              + (picture.drawings().size() > 1 ? " split" : "")
              + "\" tabindex=\"0\" role=\"region\" aria-label=\""
              + html(picture.name())
              + ", scrolls sideways where it has no room\">");
    }
    for (Picture.Drawn drawn : picture.drawings()) {
      String id = "p" + ++pictures;
      boolean repeats = drawn.use() == Picture.Use.PAPER;
      String open =
          repeats
              ? "<svg class=\"paper\" aria-hidden=\"true\" "
              : "<svg class=\""
                  + drawn.use().style()
                  + "\" role=\"img\" aria-labelledby=\""
                  + id
                  + "-t "
                  + id
                  + "-d\" ";
      String words =
          repeats
              ? ""
              : "<title id=\""
                  + id
                  + "-t\">"
                  + html(picture.caption())
                  + "</title><desc id=\""
                  + id
                  + "-d\">"
                  + html(picture.description())
                  + "</desc>";
      int end = drawn.svg().indexOf('>') + 1;
      line(
          open + drawn.svg().substring("<svg ".length(), end) + words + drawn.svg().substring(end));
      if (scrolls && drawn.use() == Picture.Use.ALWAYS) {
        line("</div>");
      }
    }
  }

  private void drawn(Part.Drawn drawn) {
    line("<div class=\"chfig\">");
    tables.caption(drawn.table());
    drawings(drawn.picture());
    tables.write(drawn.table());
    line("</div>");
  }

  private void readout(Part.Readout readout) {
    line("<div class=\"readout\"><dl class=\"addup\">");
    for (Part.Amount amount : readout.lines()) {
      String style =
          switch (amount.weight()) {
            case PLAIN -> "";
            case TOTAL -> " class=\"t\"";
            case DIFFERENCE -> " class=\"p\"";
          };
      line(
          "<dt"
              + style
              + ">"
              + html(amount.name())
              + "</dt><dd"
              + style
              + " id=\"v-"
              + amount.id()
              + "\">"
              + html(amount.amount())
              + "</dd>");
    }
    line("</dl><div><ul class=\"picks\" id=\"picks\" aria-label=\"Shortened at this finish\">");
    readout.picks().forEach(this::pick);
    if (!readout.rest().isEmpty()) {
      line("<li class=\"rest\">" + html(readout.rest()) + "</li>");
    }
    line("</ul></div></div>");
    line("<p class=\"jump js-only\">Go to");
    for (Part.Jump jump : readout.jumps()) {
      line("<a href=\"#" + html(jump.fragment()) + "\">" + html(jump.name()) + "</a>");
    }
    line("</p>");
  }

  private void pick(Part.Pick pick) {
    line(
        "<li><b>"
            + html(pick.id())
            + "</b><span>"
            + html(pick.name())
            + "</span><span>"
            + HtmlTable.tally(pick.tally())
            + "</span><span class=\"m\">"
            + html(pick.price())
            + "</span></li>");
  }

  private void line(String text) {
    out.append(text).append('\n');
  }

  private static String html(String text) {
    return Escape.html(text);
  }
}
