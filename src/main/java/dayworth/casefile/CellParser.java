package dayworth.casefile;

/** Reads the text of one cell. */
@FunctionalInterface
interface CellParser<T> {

  /**
   * The cell's value.
   *
   * @param text not blank, without spaces around it
   * @param style how numbers are written in the cell's file
   */
  T parse(String text, NumberStyle style) throws CellFault;
}
