package dayworth.report.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * What the compression map is painted with: marks are gathered and each kind is painted at once.
 */
final class MapInk {

  /** How thick the lines are that say critical. */
  static final double BAND = 2.4;

  private static final double CAP = 2.6;
  private static final double NOTCH = 4;
  private static final double HATCH_EVERY = 6;

  private final List<List<Box>> tones = new ArrayList<>();
  private final List<Box> empty = new ArrayList<>();
  private final List<Box> plates = new ArrayList<>();
  private final List<Box> relaxed = new ArrayList<>();
  private final List<Box> caps = new ArrayList<>();
  private final List<Box> notches = new ArrayList<>();
  private final List<Box> bands = new ArrayList<>();
  private final List<double[]> hatches = new ArrayList<>();

  MapInk() {
    Look.OCHRE.forEach(tone -> tones.add(new ArrayList<>()));
  }

  void bought(Box box, int tone) {
    tones.get(tone).add(box);
  }

  void empty(Box box) {
    empty.add(box);
  }

  void hatch(Box box) {
    hatches.addAll(Hatch.rising(box, HATCH_EVERY));
  }

  void cap(Box box) {
    caps.add(new Box(box.x(), box.y(), box.width(), CAP));
  }

  /** A notch in the corner: it is done by a measure. */
  void measure(Box box) {
    notches.add(new Box(box.x(), box.bottom() - NOTCH, Math.min(NOTCH, box.width()), NOTCH));
  }

  /** Paper, so that a figure in a frame can be read. */
  void plate(Box box) {
    plates.add(box);
  }

  void relaxed(Box box) {
    relaxed.add(new Box(box.x() + 1, box.y() + 1, box.width() - 2, box.height() - 2));
  }

  void critical(double left, double right, double bottom) {
    bands.add(new Box(left, bottom - BAND, right - left, BAND));
  }

  void riser(double x, double top, double height) {
    bands.add(new Box(x - BAND / 2, top, BAND, height));
  }

  void paint(Sheet sheet) {
    sheet.lines(Pen.FLOAT_HATCH, hatches);
    sheet.frames(Pen.CELL, empty);
    for (int tone = 0; tone < tones.size(); tone++) {
      sheet.fill(Look.OCHRE.get(tone), tones.get(tone));
    }
    sheet.fill(Look.INK, caps);
    sheet.fill(Look.INK, notches);
    sheet.fill(Look.PAPER, plates);
    sheet.frames(Pen.RELAXED, relaxed);
    for (Box band : bands) {
      // One by one: risers meet bands, and where a shape meets itself it would be left open.
      sheet.fill(Look.PLUM, band);
    }
  }
}
