package sliprung.review;

import sliprung.quantity.Show;
import sliprung.runup.ModelError;
import sliprung.runup.RunUpFigures;
import sliprung.starter.Starter;

/**
 * How the starts of a review were computed, and how far the steady circuit lies from the electrical
 * transient on the nominal cold start.
 *
 * @param asked as the file says
 * @param used steady or transient
 * @param error of the steady circuit on the nominal cold start
 */
public record RunUpMethod(Starter.Method asked, Starter.Method used, ModelError error) {
  /** Left to the review, the steady circuit serves up to this difference, per unit (ours). */
  public static final double CRITERION = 0.02;

  /** Chooses. Where nothing can be compared, the transient is taken. */
  public static RunUpMethod choose(Starter.Method asked, ModelError error) {
    Starter.Method used = asked;
    if (asked == Starter.Method.AUTO) {
      used = error.greatest() <= CRITERION ? Starter.Method.STEADY : Starter.Method.TRANSIENT;
    }
    return new RunUpMethod(asked, used, error);
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
    String verb = isTransient() ? "The transient feeds" : "The steady circuit feeds";
    String why =
        asked != Starter.Method.AUTO
            ? "as the file asks"
            : !error.isMeasured()
                ? "since nothing can be compared"
                : isTransient()
                    ? "since more than " + Show.percent(CRITERION) + " apart"
                    : "since all three lie within " + Show.percent(CRITERION);
    return verb + " devices and parts, " + why + ". Peaks always come from the transient.";
  }
}
