package sliprung.sampling;

import java.util.List;

/**
 * What a number of random permitted starts came to.
 *
 * @param starts how many
 * @param seed of the generator: the same seed gives the same starts
 * @param notRunUp how many never ran up
 * @param trips how often each device operated
 * @param quantities how each figure was distributed over the starts that ran up
 */
public record Sampled(
    int starts, long seed, int notRunUp, List<Trips> trips, List<Quantity> quantities) {

  /** Copies the lists. */
  public Sampled {
    trips = List.copyOf(trips);
    quantities = List.copyOf(quantities);
  }

  /**
   * How often a device operated in the last start of a series.
   *
   * @param device tag; empty: any device
   * @param relay which relay of its kind
   * @param series cold or hot
   * @param count of starts in which it operated
   * @param starts of all
   * @param bounds of the share
   * @param notJudged it could not be computed: the count means nothing
   */
  public record Trips(
      String device,
      String relay,
      String series,
      int count,
      int starts,
      BinomialBounds bounds,
      boolean notJudged) {

    /** Share of starts. */
    public double share() {
      return (double) count / starts;
    }
  }

  /**
   * How a figure was distributed.
   *
   * @param name in words
   * @param unit empty for a share of a limit
   * @param percentiles in the order of {@link #PERCENTS}
   */
  public record Quantity(String name, String unit, List<Double> percentiles) {

    /** Copies the list. */
    public Quantity {
      percentiles = List.copyOf(percentiles);
    }
  }

  /** Which percentiles are told. */
  public static final List<Integer> PERCENTS = List.of(1, 5, 50, 95, 99);
}
