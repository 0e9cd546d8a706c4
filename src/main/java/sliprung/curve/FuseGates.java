package sliprung.curve;

/**
 * What IEC 60269-1 pins of one gG fuse-link: gates, not a curve. Currents in RMS amperes.
 *
 * @param ratingAmps rated current
 * @param notIn10sAmps does not melt within 10 s
 * @param within5sAmps melts within 5 s
 * @param notIn100msAmps does not melt within 0.1 s
 * @param within100msAmps melts within 0.1 s
 * @param leastPreArcing least pre-arcing I²t at 0.01 s, A²s
 * @param greatestPreArcing greatest pre-arcing I²t at 0.01 s, A²s
 * @param nonFusingAmps conventional non-fusing current
 * @param fusingAmps conventional fusing current
 * @param conventionalSeconds conventional time
 * @param reference standard and tables
 * @param mark {@code verified} or {@code from memory}
 */
public record FuseGates(
    double ratingAmps,
    double notIn10sAmps,
    double within5sAmps,
    double notIn100msAmps,
    double within100msAmps,
    double leastPreArcing,
    double greatestPreArcing,
    double nonFusingAmps,
    double fusingAmps,
    double conventionalSeconds,
    String reference,
    String mark) {}
