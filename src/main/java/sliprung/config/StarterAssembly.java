package sliprung.config;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import sliprung.curve.CurveLibrary;
import sliprung.curve.PointCurve;
import sliprung.quantity.Dimension;
import sliprung.starter.AcceptedDeviation;
import sliprung.starter.Ambient;
import sliprung.starter.Conductor;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Distribution;
import sliprung.starter.Duty;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Interlocks;
import sliprung.starter.Limits;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.Readings;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.Supply;
import sliprung.starter.Varying;

/** Puts one starter together from its parts, each of which has a reader of its own. */
final class StarterAssembly {
  private static final String[] KEYS = {
    "sliprung",
    "starter",
    "practice",
    "supply",
    "motor",
    "load",
    "resistors",
    "steps",
    "sequence",
    "method",
    "timer-spread",
    "level-spread",
    "contactors",
    "breakers",
    "protection",
    "conductors",
    "duty",
    "limits",
    "margins",
    "fuse-wear",
    "interlocks",
    "ambient",
    "evidence",
    "distributions",
    "accepted",
    "readings"
  };

  /** Names of parts in a record: a device of that tag could not be told from the part. */
  private static final Set<String> PARTS =
      Set.of("stator", "rotor", "rings", "stator-conductor", "rotor-conductor");

  private static final Map<String, Starter.Method> METHODS =
      Words.inOrder(
          "auto",
          Starter.Method.AUTO,
          "steady",
          Starter.Method.STEADY,
          "transient",
          Starter.Method.TRANSIENT);

  private final Reading reading;
  private final CurveLibrary library;
  private final Set<String> knownRules;
  private final CurveFiles curves;
  private final Map<String, InputFile> inputs = new LinkedHashMap<>();

  StarterAssembly(
      SourceText source,
      InputFile input,
      CurveLibrary library,
      Set<String> knownRules,
      CurveFiles curves) {
    this.reading = new Reading(source);
    this.library = library;
    this.knownRules = knownRules;
    this.curves = curves;
    inputs.put("", input);
  }

  StarterReading read() {
    Optional<YamlNode> tree = YamlTree.compose(reading);
    if (tree.isEmpty()) {
      return new StarterReading.Refused(reading.diagnostics());
    }
    Place start = new Place(reading.source().name(), 1, 1);
    if (!(tree.get() instanceof YamlNode.Mapping mapping)) {
      if (!(tree.get() instanceof YamlNode.Refused)) {
        reading.mistake(
            tree.get().place(),
            "",
            "expected a mapping of keys to values but found " + tree.get().found(),
            Optional.of("begin with 'sliprung: 1'"));
      }
      return new StarterReading.Refused(reading.diagnostics());
    }
    Optional<Starter> starter = starter(Section.of(reading, "", start, mapping, KEYS));
    return starter.isEmpty() || reading.hasMistakes()
        ? new StarterReading.Refused(reading.diagnostics())
        : new StarterReading.Described(
            starter.get(), reading.places(), reading.values(), new ArrayList<>(inputs.values()));
  }

  /** The starter; empty where a mistake would make a record that means nothing. */
  private Optional<Starter> starter(Section root) {
    root.required("sliprung", "the version of this format", "1")
        .ifPresent(f -> StarterReader.version(f, "starter"));
    Optional<String> name = root.text("starter", "the starter's tag", "JC-1 primary jaw crusher");
    Optional<Starter.Practice> practice =
        root.choice(
            "practice", Words.inOrder("iec", Starter.Practice.IEC, "nec", Starter.Practice.NEC));
    Supply supply = SupplyReader.read(root);
    Motor motor = MotorReader.read(root);
    Load load = LoadReader.read(root);
    ResistorBank resistors = BankReader.read(root);
    Switchgear switchgear = SwitchgearReader.read(root);
    List<Step> steps = StepsReader.read(root, switchgear, resistors.sections().size());
    Starter.Sequence sequence =
        root.choiceOr(
            "sequence",
            Words.inOrder(
                "chained", Starter.Sequence.CHAINED, "cascaded", Starter.Sequence.CASCADED),
            Starter.Sequence.CHAINED,
            "chained");
    Starter.Method method =
        root.optional("method").flatMap(f -> f.choice(METHODS)).orElse(Starter.Method.AUTO);
    double timerSpread = root.numberOr("timer-spread", Dimension.SHARE, Range.SPREAD, 0.05, "5 %");
    double levelSpread = root.numberOr("level-spread", Dimension.SHARE, Range.SPREAD, 0.10, "10 %");
    List<Device> devices =
        new DeviceReader(library, this::pointCurve, resistors.sections().size())
            .read(root, switchgear);
    PlantReader plant = new PlantReader(root);
    Section conductors = plant.conductors();
    Optional<Conductor> stator = PlantReader.conductor(conductors, "stator");
    Optional<Conductor> rotor = PlantReader.conductor(conductors, "rotor");
    Duty duty = DutyReader.read(root, steps.size());
    Limits limits = plant.limits();
    double fuseWear = plant.fuseWear();
    Interlocks interlocks = plant.interlocks();
    Ambient ambient = plant.ambient();
    JudgementReader judgement = new JudgementReader(root, knownRules);
    Map<String, Double> margins = judgement.margins();
    List<AcceptedDeviation> accepted = judgement.accepted();
    Map<Varying, Distribution> distributions = judgement.distributions();
    Optional<Readings> readings = ReadingsReader.read(root, supply, steps);
    tags(root);
    coordination(root, switchgear);
    Map<String, EvidenceGrade> evidence = judgement.evidence();
    if (reading.hasMistakes()) {
      return Optional.empty();
    }
    return Optional.of(
        new Starter(
            name.orElseThrow(),
            practice.orElseThrow(),
            supply,
            motor,
            load,
            resistors,
            steps,
            sequence,
            timerSpread,
            levelSpread,
            switchgear.contactors(),
            switchgear.breakers(),
            devices,
            stator,
            rotor,
            duty,
            limits,
            margins,
            fuseWear,
            interlocks,
            ambient,
            evidence,
            accepted,
            reading.assumptions(),
            reading.notYetJudged(),
            method,
            reading.dialScales(),
            distributions,
            readings));
  }

  /** One tag, one thing: findings name their subject by its tag. */
  private void tags(Section root) {
    Map<String, Place> seen = new HashMap<>();
    for (String group : List.of("contactors", "breakers", "protection")) {
      Optional<Field> field = root.optional(group);
      if (field.isEmpty() || !(field.get().value() instanceof YamlNode.Mapping mapping)) {
        continue;
      }
      Map<String, Place> here = new HashMap<>();
      for (YamlNode.Entry entry : mapping.entries()) {
        if (entry.key() instanceof YamlNode.Scalar key) {
          tag(group, key, seen);
          here.putIfAbsent(key.text(), key.place());
        }
      }
      seen.putAll(here);
    }
  }

  private void tag(String group, YamlNode.Scalar key, Map<String, Place> seen) {
    String tag = key.text();
    String path = group + "." + Wording.clip(tag);
    if (tag.isBlank() || !tag.equals(Wording.clip(tag))) {
      reading.mistake(
          key.place(),
          path,
          "expected a tag of one line and up to 60 letters but found " + key.found());
    } else if (PARTS.contains(tag) || tag.matches("section-\\d+")) {
      reading.mistake(
          key.place(),
          path,
          "expected a tag but found '" + tag + "', which names a part of every starter");
    } else if (seen.containsKey(tag)) {
      reading.mistake(
          key.place(),
          path,
          "expected a tag of its own but found '"
              + tag
              + "' again; the first is on line "
              + seen.get(tag).line());
    }
  }

  /** A declared combination names a fuse or a breaker. */
  private void coordination(Section root, Switchgear switchgear) {
    Optional<Field> protection = root.optional("protection");
    if (!switchgear.readable()
        || protection.isEmpty()
        || !(protection.get().value() instanceof YamlNode.Mapping devices)) {
      return;
    }
    Set<String> known = new HashSet<>();
    devices.entries().stream()
        .filter(e -> e.key() instanceof YamlNode.Scalar)
        .forEach(e -> known.add(((YamlNode.Scalar) e.key()).text()));
    switchgear.breakers().forEach(b -> known.add(b.tag()));
    for (Contactor contactor : switchgear.contactors()) {
      Optional<String> with = contactor.coordination().map(Contactor.Coordination::with);
      if (with.isPresent() && !known.contains(with.get())) {
        String path = "contactors." + Wording.clip(contactor.tag()) + ".coordination.with";
        reading.mistake(
            reading.place(path).orElse(new Place(reading.source().name(), 1, 1)),
            path,
            "expected the tag of a fuse or breaker but found '"
                + Wording.clip(with.get())
                + "', which nothing has");
      }
    }
  }

  /** The curve of a device given as points; its mistakes join those of the starter file. */
  private Optional<PointCurve> pointCurve(Field path, double ratingAmps) {
    Optional<String> text = path.text("the path of a curve file");
    if (text.isEmpty()) {
      return Optional.empty();
    }
    CurveFiles.Loaded loaded = curves.load(text.get());
    if (loaded instanceof CurveFiles.Refusal refusal) {
      path.mistake(
          "expected a curve file but found " + refusal.reason() + ", " + path.value().found());
      return Optional.empty();
    }
    byte[] bytes = ((CurveFiles.Content) loaded).bytes();
    SourceText.Decoded decoded = SourceText.decode(text.get(), bytes);
    if (decoded.mistake().isPresent()) {
      reading.add(decoded.mistake().get());
      return Optional.empty();
    }
    inputs.put(text.get(), new InputFile(text.get(), bytes, decoded.source().text()));
    Reading own = new Reading(decoded.source());
    Optional<PointCurve> curve =
        PointCurveReader.read(own, Double.isNaN(ratingAmps) ? 1.0 : ratingAmps);
    own.diagnostics().forEach(reading::add);
    return curve;
  }
}
