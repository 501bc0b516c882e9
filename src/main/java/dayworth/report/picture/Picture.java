package dayworth.report.picture;

/** A picture that can be painted on any sheet of its size. */
interface Picture {

  /** Pixels. */
  int width();

  /** Pixels. */
  int height();

  /** The finding, as one sentence. */
  String title();

  /** What the picture shows, with its figures, for those who do not see it. */
  String description();

  void paint(Sheet sheet);
}
