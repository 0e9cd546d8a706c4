package sliprung.runup;

/**
 * What is supposed to happen.
 *
 * @param kind of start
 * @param step the step concerned, from 1; 0 where the kind has none
 * @param load the load it meets
 */
public record Scenario(Kind kind, int step, LoadMode load) {

  /** Kind of start. */
  public enum Kind {
    /** As wired, nothing fails. */
    PERMITTED,
    /** Contactor {@code step} never closes and the sequence stops there. */
    HELD,
    /** Contactor {@code step} fails, later ones still close (cascaded timers). */
    SKIPPED,
    /** The rotor does not turn; the sequence runs as wired. */
    LOCKED,
    /** The rotor does not turn and the sequence is frozen on {@code step}. */
    LOCKED_STEP,
    /** At rest on the last step's circuit. */
    RINGS_SHORTED,
    /** Jams while running: at rest on the last step's circuit, every step contactor closed. */
    RUNNING_LOCKED,
    /** The last contactor of a star-point bank is welded: started on the last step's circuit. */
    RINGS_SHORTED_START,
    /** Contactor {@code step} is welded: started with what it cuts out already out. */
    WELDED,
    /**
     * The line contactor drops and returns with every step contactor still closed. How long it was
     * off is not known: the rotor is taken to have coasted to rest, which heats most, and the peaks
     * are the greatest of any dead time.
     */
    RECLOSED
  }

  /** Which load the motor meets. */
  public enum LoadMode {
    /** The starting torque. */
    START,
    /** Settled at the starting torque, then loaded to the running torque. */
    RUNNING
  }

  /** The permitted start. */
  public static final Scenario PERMITTED = new Scenario(Kind.PERMITTED, 0, LoadMode.START);

  /** Whether this is a fault. */
  public boolean isFault() {
    return kind != Kind.PERMITTED;
  }

  /** Stable name: {@code start}, {@code held-2}, {@code held-2-running}, {@code locked} … */
  public String id() {
    String base =
        switch (kind) {
          case PERMITTED -> "start";
          case HELD -> "held-" + step;
          case SKIPPED -> "skipped-" + step;
          case LOCKED -> "locked";
          case LOCKED_STEP -> "locked-" + step;
          case RINGS_SHORTED -> "rings-shorted";
          case RUNNING_LOCKED -> "running-locked";
          case RINGS_SHORTED_START -> "rings-shorted-start";
          case WELDED -> "welded-" + step;
          case RECLOSED -> "reclosed";
        };
    return load == LoadMode.RUNNING ? base + "-running" : base;
  }

  /** In words. */
  public String words() {
    String base =
        switch (kind) {
          case PERMITTED -> "permitted start";
          case HELD -> "held on step " + step;
          case SKIPPED -> "step contactor " + step + " skipped";
          case LOCKED -> "locked, sequence running";
          case LOCKED_STEP -> "locked on step " + step;
          case RINGS_SHORTED -> "at rest with rings shorted";
          case RUNNING_LOCKED -> "jammed while running";
          case RINGS_SHORTED_START -> "started with rings shorted";
          case WELDED -> "started with step contactor " + step + " welded";
          case RECLOSED -> "reclosed with every step contactor closed";
        };
    return load == LoadMode.RUNNING ? base + " at running load" : base;
  }
}
