package sliprung.record;

/** A size of paper. */
public enum Paper {
  A4("A4", 178.0),
  LETTER("letter", 184.0);

  private final String css;
  private final double textMillimetres;

  Paper(String css, double textMillimetres) {
    this.css = css;
    this.textMillimetres = textMillimetres;
  }

  /** Its name in a style sheet. */
  String css() {
    return css;
  }

  /** Width between the margins, mm. */
  double textMillimetres() {
    return textMillimetres;
  }
}
