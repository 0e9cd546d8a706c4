package sliprung.config;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import sliprung.quantity.Dimension;
import sliprung.starter.Breaker;
import sliprung.starter.Contactor;

/** Reads {@code contactors} and {@code breakers}. */
final class SwitchgearReader {
  private static final String[] CATEGORIES = {"AC-1", "AC-2", "AC-3", "AC-3e", "AC-4"};

  private final Set<String> unplaced = new HashSet<>();

  private SwitchgearReader() {}

  static Switchgear read(Section root) {
    return new SwitchgearReader().readBoth(root);
  }

  private Switchgear readBoth(Section root) {
    Optional<Field> field =
        root.required("contactors", "a mapping of tags to contactors", "{K1: {place: line}}");
    Section contactors =
        field
            .map(f -> f.section())
            .orElseGet(() -> Section.silent(root.reading(), "contactors", root.place()));
    List<Contactor> built = new ArrayList<>();
    contactors.fields().forEach(f -> built.add(contactor(f)));
    if (!contactors.isSilent()
        && unplaced.isEmpty()
        && built.stream().noneMatch(c -> c.place() == Contactor.Place.LINE)) {
      field
          .get()
          .mistake(
              "expected a contactor with place line but found none",
              "add for example 'K1: {place: line}'");
    }
    Optional<Field> breakerField = root.optional("breakers");
    List<Breaker> breakers = new ArrayList<>();
    boolean readable = !contactors.isSilent();
    if (breakerField.isPresent()) {
      Section section = breakerField.get().section();
      readable &= !section.isSilent();
      section.fields().forEach(f -> breakers.add(breaker(f)));
    }
    return new Switchgear(built, breakers, unplaced, readable);
  }

  private Contactor contactor(Field field) {
    String tag = field.key();
    Section contactor =
        field.section(
            "place",
            "ratings",
            "rated-voltage",
            "poles",
            "thermal",
            "rotor-rating",
            "short-time",
            "closing",
            "opening",
            "coordination",
            "intermittent-class",
            "breaking");
    Optional<Contactor.Place> place =
        contactor.choice(
            "place", Words.inOrder("line", Contactor.Place.LINE, "rotor", Contactor.Place.ROTOR));
    if (place.isEmpty()) {
      unplaced.add(tag);
    }
    Optional<Contactor.Poles> poles =
        contactor
            .optional("poles")
            .flatMap(
                f ->
                    f.choice(
                        Words.inOrder(
                            "star",
                            Contactor.Poles.STAR,
                            "delta",
                            Contactor.Poles.DELTA,
                            "two",
                            Contactor.Poles.TWO)));
    return new Contactor(
        tag,
        place.orElse(Contactor.Place.ROTOR),
        ratings(contactor),
        contactor.optionalNumber("rated-voltage", Dimension.VOLTAGE, Range.POSITIVE),
        poles,
        contactor.optionalNumber("thermal", Dimension.CURRENT, Range.POSITIVE),
        contactor.optionalNumber("rotor-rating", Dimension.CURRENT, Range.POSITIVE),
        MotorReader.shortTime(contactor, "short-time"),
        contactor.numberOr("closing", Dimension.TIME, Range.NOT_NEGATIVE, 0.060, "60 ms"),
        contactor.numberOr("opening", Dimension.TIME, Range.NOT_NEGATIVE, 0.060, "60 ms"),
        coordination(contactor),
        contactor.optionalNumber("intermittent-class", Dimension.NUMBER, Range.POSITIVE),
        contactor.optionalNumber("breaking", Dimension.CURRENT, Range.POSITIVE));
  }

  private static Map<String, Double> ratings(Section contactor) {
    Map<String, Double> ratings = new TreeMap<>();
    contactor
        .optional("ratings")
        .map(f -> f.section(CATEGORIES))
        .ifPresent(
            section -> {
              for (String category : CATEGORIES) {
                OptionalDouble amps =
                    section.optionalNumber(category, Dimension.CURRENT, Range.POSITIVE);
                amps.ifPresent(a -> ratings.put(category, a));
              }
            });
    return ratings;
  }

  private static Optional<Contactor.Coordination> coordination(Section contactor) {
    Optional<Field> field = contactor.optional("coordination");
    if (field.isEmpty()) {
      return Optional.empty();
    }
    Section section = field.get().section("type", "with", "up-to");
    Optional<Integer> type =
        section.required("type", "a type of coordination", "2").flatMap(f -> f.whole(1, 2));
    Optional<String> with = section.text("with", "the tag of a fuse or breaker", "F1");
    OptionalDouble upTo = section.optionalNumber("up-to", Dimension.CURRENT, Range.POSITIVE);
    return type.isPresent() && with.isPresent()
        ? Optional.of(new Contactor.Coordination(type.get(), with.get(), upTo))
        : Optional.empty();
  }

  private static Breaker breaker(Field field) {
    Section breaker = field.section("breaking", "opening");
    return new Breaker(
        field.key(),
        breaker.optionalNumber("breaking", Dimension.CURRENT, Range.POSITIVE),
        breaker.numberOr("opening", Dimension.TIME, Range.NOT_NEGATIVE, 0.100, "100 ms"));
  }
}
