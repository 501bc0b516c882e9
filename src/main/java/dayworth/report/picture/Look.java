package dayworth.report.picture;

import java.awt.Color;
import java.util.List;

/** The colours of the pictures: light paper, dark words, one colour for each thing that is told. */
final class Look {

  static final Color PAPER = new Color(0xFBFAF7);
  static final Color INK = new Color(0x1F2A30);
  static final Color QUIET = new Color(0x56646F);
  static final Color RULE = new Color(0xD9D5CC);
  static final Color EDGE = new Color(0x857F72);
  static final Color HATCH = new Color(0xBDB8AB);
  static final Color PLUM = new Color(0x7A3E65);
  static final Color PLUM_WASH = new Color(0xEEE8E8);
  static final Color TEAL = new Color(0x1F8A83);
  static final Color TEAL_INK = new Color(0x14706A);
  static final Color SLATE = new Color(0x6B7A86);
  static final Color SLATE_INK = new Color(0x56646F);
  static final Color SLATE_WASH = new Color(0xE4E7E8);
  static final Color BRICK = new Color(0x9A4F2E);
  static final Color BRICK_WASH = new Color(0xF1DFD4);
  static final Color OLIVE = new Color(0x6E7F2B);
  static final Color OLIVE_INK = new Color(0x5B6A20);
  static final Color OLIVE_WASH = new Color(0xE6EAD0);

  /** Ochre, from hardly compressed to as far as it will go. */
  static final List<Color> OCHRE =
      List.of(
          new Color(0xF4E6C9),
          new Color(0xECD3A2),
          new Color(0xE0BA72),
          new Color(0xD39F47),
          new Color(0xC4841D));

  private Look() {}
}
