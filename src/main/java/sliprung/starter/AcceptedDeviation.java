package sliprung.starter;

import java.time.LocalDate;
import java.util.Optional;

/**
 * A breach or tight margin that someone answers for.
 *
 * @param rule as {@code family/slug}
 * @param subject device or part
 * @param notBelow least margin for which the acceptance holds
 * @param reason why
 * @param by role that answers for it
 * @param until last day
 * @param place file:line, for findings about the acceptance itself
 */
public record AcceptedDeviation(
    String rule,
    String subject,
    double notBelow,
    String reason,
    String by,
    LocalDate until,
    Optional<String> place) {}
