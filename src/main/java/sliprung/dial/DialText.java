package sliprung.dial;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import sliprung.dial.Judgement.Question;
import sliprung.quantity.Dimension;

/** Settings and bounds in words, for terminal and page. */
public final class DialText {
  private static final MathContext DOWN = new MathContext(3, RoundingMode.FLOOR);
  private static final MathContext UP = new MathContext(3, RoundingMode.CEILING);

  private DialText() {}

  /** A setting with its unit, every digit that it has. */
  public static String setting(Dial dial, double value) {
    return withUnit(plain(new BigDecimal(Double.toString(value))), dial.dimension());
  }

  /** The low end of a window, rounded up: what is printed lies inside. */
  public static String low(Dial dial, double value) {
    return withUnit(plain(new BigDecimal(value).round(UP)), dial.dimension());
  }

  /** The high end of a window, rounded down: what is printed lies inside. */
  public static String high(Dial dial, double value) {
    return withUnit(plain(new BigDecimal(value).round(DOWN)), dial.dimension());
  }

  /** {@code 253 A to 271 A}. */
  public static String range(Dial dial, Window window) {
    return low(dial, window.low()) + " to " + high(dial, window.high());
  }

  private static String plain(BigDecimal number) {
    return number.signum() == 0 ? "0" : number.stripTrailingZeros().toPlainString();
  }

  private static String withUnit(String number, Dimension dimension) {
    return dimension.unit().isEmpty() ? number : number + "\u00a0" + dimension.unit();
  }

  /** What bounds a window there, such as {@code trip/start F3: hot start, 90 % volts …}. */
  public static String bound(Dial dial, Window.Bound bound) {
    if (bound.breaks().isEmpty()) {
      return dial.scale().hasRange()
          ? "end of the dial: no rule breaks up to it"
          : "no rule breaks up to "
              + setting(dial, Dial.threeFigures(bound.outside()))
              + ", the end of the search";
    }
    Question question = bound.breaks().get();
    String head = question.rule() + ", " + question.subject();
    if (bound.answer().isEmpty()) {
      return head + ": is not answered any more";
    }
    String verdict = bound.answer().get().isJudged() ? "" : " is not judged any more";
    String where = bound.answer().get().circumstances();
    return head + verdict + (where.isEmpty() ? "" : ": " + where);
  }

  /** {@code rule, subject}. */
  public static String words(Question question) {
    return question.rule() + ", " + question.subject();
  }
}
