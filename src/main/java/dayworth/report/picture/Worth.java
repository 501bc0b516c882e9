package dayworth.report.picture;

import java.awt.Color;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/**
 * One part of what a unit of time is worth, as bands on top of the parts below it.
 *
 * @param share of a stretch's worth
 * @param below what lies under it
 */
record Worth(
    String name,
    Color ink,
    Color wash,
    Pen pen,
    Function<Stretch, BigDecimal> share,
    Function<Stretch, BigDecimal> below) {

  private static final double EVERY = 5;

  /** Neighbouring stretches that are worth the same. */
  record Band(long from, long to, BigDecimal low, BigDecimal share) {

    BigDecimal high() {
      return low.add(share);
    }
  }

  static List<Worth> all() {
    return List.of(
        new Worth(
            "Time-related cost",
            Look.SLATE_INK,
            Look.SLATE_WASH,
            Pen.TIME_HATCH,
            Stretch::time,
            stretch -> BigDecimal.ZERO),
        new Worth(
            "Damages",
            Look.BRICK,
            Look.BRICK_WASH,
            Pen.DAMAGES_HATCH,
            Stretch::damages,
            Stretch::time),
        new Worth(
            "Bonus",
            Look.OLIVE_INK,
            Look.OLIVE_WASH,
            Pen.BONUS_DOTS,
            Stretch::bonus,
            stretch -> stretch.time().add(stretch.damages())));
  }

  /** Where it is worth something. */
  List<Band> bands(List<Stretch> stretches) {
    List<Band> bands = new ArrayList<>();
    for (Stretch stretch : stretches) {
      Band band =
          new Band(stretch.from(), stretch.to(), below.apply(stretch), share.apply(stretch));
      Band last = bands.isEmpty() ? null : bands.get(bands.size() - 1);
      if (last != null
          && last.to() == band.from()
          && last.low().compareTo(band.low()) == 0
          && last.share().compareTo(band.share()) == 0) {
        bands.set(bands.size() - 1, new Band(last.from(), band.to(), band.low(), band.share()));
      } else if (band.share().signum() > 0) {
        bands.add(band);
      }
    }
    return bands;
  }

  void paint(Sheet sheet, Box box) {
    sheet.fill(wash, box);
    sheet.lines(pen, hatch(box));
  }

  private List<double[]> hatch(Box box) {
    if (pen.equals(Pen.TIME_HATCH)) {
      return Hatch.level(box, EVERY);
    }
    return pen.equals(Pen.BONUS_DOTS) ? Hatch.dots(box, EVERY + 1) : Hatch.rising(box, EVERY + 3);
  }
}
