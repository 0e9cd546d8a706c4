package sliprung.review;

import java.util.Map;
import sliprung.quantity.Show;
import sliprung.runup.ModelError;
import sliprung.runup.RunUpFigures;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/**
 * How the starts of a review were computed, and how far the steady circuit lies from the electrical
 * transient.
 *
 * @param asked as the file says
 * @param used steady or transient
 * @param error of the steady circuit on the nominal cold start
 * @param worstCorner where it errs most on a permitted start; where it cannot be compared, that one
 * @param worst its error there
 */
public record RunUpMethod(
    Starter.Method asked,
    Starter.Method used,
    ModelError error,
    Corner worstCorner,
    ModelError worst) {
  /** Left to the review, the steady circuit serves up to this difference, per unit (ours). */
  public static final double CRITERION = 0.02;

  /**
   * Chooses. The steady circuit serves where run-up time and both I²t lie within the criterion at
   * every corner; a corner at which one way runs up and the other does not lies outside it.
   *
   * @param errors by corner, the nominal one among them
   */
  public static RunUpMethod choose(Starter.Method asked, Map<Corner, ModelError> errors) {
    Map.Entry<Corner, ModelError> worst = null;
    for (Map.Entry<Corner, ModelError> entry : errors.entrySet()) {
      if (worst == null || weight(entry.getValue()) > weight(worst.getValue())) {
        worst = entry;
      }
    }
    Starter.Method used = asked;
    if (asked == Starter.Method.AUTO) {
      used =
          weight(worst.getValue()) <= CRITERION ? Starter.Method.STEADY : Starter.Method.TRANSIENT;
    }
    return new RunUpMethod(
        asked, used, errors.get(Corner.NOMINAL), worst.getKey(), worst.getValue());
  }

  /** Where neither way runs up there is no start to get wrong; where one does, everything is. */
  private static double weight(ModelError error) {
    if (error.isMeasured()) {
      return error.greatest();
    }
    boolean neither =
        Double.isNaN(error.steady().runUpSeconds())
            && Double.isNaN(error.withTransient().runUpSeconds());
    return neither ? 0.0 : Double.POSITIVE_INFINITY;
  }

  /** Whether the transient feeds devices and parts. */
  public boolean isTransient() {
    return used == Starter.Method.TRANSIENT;
  }

  /** One line of words: the difference, and what was made of it. */
  public String says() {
    return difference() + " " + choice();
  }

  private String difference() {
    if (!error.isMeasured()) {
      return "The model error could not be measured: the nominal cold start does not run up.";
    }
    RunUpFigures steady = error.steady();
    RunUpFigures full = error.withTransient();
    return "On the nominal cold start the steady circuit gives a run-up of "
        + Show.seconds(steady.runUpSeconds())
        + " against "
        + Show.seconds(full.runUpSeconds())
        + " with the electrical transient ("
        + signed(error.runUp())
        + "), stator I²t "
        + signed(error.statorSquare())
        + ", ring I²t "
        + signed(error.ringSquare())
        + ".";
  }

  private static String signed(double share) {
    return String.format(java.util.Locale.ROOT, "%+.2f\u00a0%%", 100.0 * share).replace('-', '−');
  }

  private String choice() {
    String feeds = isTransient() ? "The transient feeds" : "The steady circuit feeds";
    return feeds + " devices and parts, " + why() + ". Peaks always come from the transient.";
  }

  private String why() {
    if (asked != Starter.Method.AUTO) {
      return "as the file asks";
    }
    if (!isTransient()) {
      return "since over all corners nothing is further apart than "
          + Show.percent(weight(worst))
          + " (limit "
          + Show.percent(CRITERION)
          + ")";
    }
    return worst.isMeasured()
        ? "since up to "
            + Show.percent(worst.greatest())
            + " lie between them (limit "
            + Show.percent(CRITERION)
            + "; at "
            + worstCorner.words()
            + ")"
        : "since only one of them runs up at " + worstCorner.words();
  }
}
