package sliprung.runup;

/**
 * How far the steady circuit lies from the electrical transient on one start.
 *
 * @param steady figures with the steady circuit
 * @param withTransient figures with the transient
 */
public record ModelError(RunUpFigures steady, RunUpFigures withTransient) {

  /** Of the same start computed both ways. */
  public static ModelError between(StartHistory steady, StartHistory withTransient) {
    return new ModelError(RunUpFigures.of(steady), RunUpFigures.of(withTransient));
  }

  /** Run-up time of the steady circuit over that of the transient, less 1; NaN: not comparable. */
  public double runUp() {
    return steady.runUpSeconds() / withTransient.runUpSeconds() - 1.0;
  }

  /** Likewise for the stator's ∫I² dt. */
  public double statorSquare() {
    return steady.statorSquare() / withTransient.statorSquare() - 1.0;
  }

  /** Likewise for the rings' ∫I² dt. */
  public double ringSquare() {
    return steady.ringSquare() / withTransient.ringSquare() - 1.0;
  }

  /** Whether both ways ran up, so that there is something to compare. */
  public boolean isMeasured() {
    return !Double.isNaN(greatest());
  }

  /** The greatest of the three, without its sign; NaN where one did not run up. */
  public double greatest() {
    return Math.max(Math.abs(runUp()), Math.max(Math.abs(statorSquare()), Math.abs(ringSquare())));
  }
}
