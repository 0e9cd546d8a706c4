package sliprung.config;

import java.io.StringReader;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import org.yaml.snakeyaml.LoaderOptions;
import org.yaml.snakeyaml.Yaml;
import org.yaml.snakeyaml.error.Mark;
import org.yaml.snakeyaml.error.MarkedYAMLException;
import org.yaml.snakeyaml.error.YAMLException;
import org.yaml.snakeyaml.events.AliasEvent;
import org.yaml.snakeyaml.events.CollectionStartEvent;
import org.yaml.snakeyaml.events.DocumentStartEvent;
import org.yaml.snakeyaml.events.Event;
import org.yaml.snakeyaml.events.MappingEndEvent;
import org.yaml.snakeyaml.events.MappingStartEvent;
import org.yaml.snakeyaml.events.NodeEvent;
import org.yaml.snakeyaml.events.ScalarEvent;
import org.yaml.snakeyaml.events.SequenceEndEvent;

/**
 * Builds the tree of a YAML document from the parser's events, with the place of every node and
 * with bounds: one document, no aliases, anchors or tags, limited depth and number of nodes.
 */
final class YamlTree {
  private static final int DEEPEST = 12;
  private static final int MOST_NODES = 50_000;

  private final Reading reading;
  private final Deque<Frame> open = new ArrayDeque<>();
  private YamlNode root = null;
  private int documents = 0;
  private int nodes = 0;

  private YamlTree(Reading reading) {
    this.reading = reading;
  }

  /** A collection whose end has not come yet. */
  private record Frame(Place place, boolean mapping, List<YamlNode> children) {}

  /** The root of the only document; empty after a mistake that leaves nothing to read. */
  static Optional<YamlNode> compose(Reading reading) {
    SourceText source = reading.source();
    Optional<Integer> unprintable = source.firstUnprintable();
    if (unprintable.isPresent()) {
      int position = unprintable.get();
      reading.mistake(
          source.placeAt(position),
          "",
          String.format(
              java.util.Locale.ROOT,
              "expected printable text but found the character U+%04X",
              source.text().codePointAt(position)));
      return Optional.empty();
    }
    return new YamlTree(reading).walk(source);
  }

  private Optional<YamlNode> walk(SourceText source) {
    LoaderOptions options = new LoaderOptions();
    options.setCodePointLimit(Integer.MAX_VALUE);
    try {
      Iterator<Event> events = new Yaml(options).parse(new StringReader(source.text())).iterator();
      while (events.hasNext()) {
        if (!take(events.next())) {
          return Optional.empty();
        }
      }
    } catch (MarkedYAMLException e) {
      Mark mark = e.getProblemMark() != null ? e.getProblemMark() : e.getContextMark();
      syntax(mark == null ? new Place(source.name(), 1, 1) : place(mark), e.getProblem());
      return Optional.empty();
    } catch (YAMLException e) {
      syntax(new Place(source.name(), 1, 1), e.getMessage());
      return Optional.empty();
    }
    if (root == null) {
      reading.mistake(
          new Place(source.name(), 1, 1),
          "",
          "expected a description but found an empty file",
          Optional.of("begin with 'sliprung: 1'"));
    }
    return Optional.ofNullable(root);
  }

  private void syntax(Place place, String problem) {
    String said = problem == null ? "broken YAML" : Wording.clip(problem);
    boolean tab = said.contains("TAB") || said.contains("'\\t'");
    boolean token = said.contains("cannot start any token");
    reading.mistake(
        place,
        "",
        "expected YAML but found a mistake in its form: " + said,
        tab
            ? Optional.of("indent with spaces, not with tabs")
            : token
                ? Optional.of("put the text in quotes")
                : Optional.of(
                    "check the indentation, brackets and quotes at and before this place"));
  }

  /** Takes one event; false to stop reading. */
  private boolean take(Event event) {
    if (event instanceof DocumentStartEvent) {
      documents++;
      if (documents > 1) {
        reading.mistake(
            place(event.getStartMark()), "", "expected one document but found a second one");
        return false;
      }
      return true;
    }
    if (event instanceof MappingEndEvent || event instanceof SequenceEndEvent) {
      close();
      return true;
    }
    if (event instanceof NodeEvent node) {
      return takeNode(node);
    }
    return true;
  }

  private boolean takeNode(NodeEvent event) {
    Place place = place(event.getStartMark());
    nodes++;
    if (nodes > MOST_NODES) {
      reading.mistake(place, "", "expected at most " + MOST_NODES + " values but found more");
      return false;
    }
    if (event instanceof AliasEvent) {
      reading.mistake(
          place,
          "",
          "expected a value but found an alias, '*" + Wording.clip(event.getAnchor()) + "'",
          Optional.of("write the value out"));
      add(new YamlNode.Refused(place));
      return true;
    }
    if (event.getAnchor() != null) {
      reading.mistake(
          place,
          "",
          "expected a value but found an anchor, '&" + Wording.clip(event.getAnchor()) + "'",
          Optional.of("write the value out wherever it is needed"));
    }
    if (event instanceof ScalarEvent scalar) {
      refuseTag(place, scalar.getTag());
      add(new YamlNode.Scalar(place, scalar.getValue(), !scalar.isPlain()));
      return true;
    }
    refuseTag(place, ((CollectionStartEvent) event).getTag());
    if (open.size() == DEEPEST) {
      reading.mistake(
          place, "", "expected at most " + DEEPEST + " levels but found a deeper nesting");
      return false;
    }
    open.push(new Frame(place, event instanceof MappingStartEvent, new ArrayList<>()));
    return true;
  }

  private void refuseTag(Place place, String tag) {
    if (tag != null) {
      reading.mistake(
          place,
          "",
          "expected a value but found a tag, '" + Wording.clip(tag) + "'",
          Optional.of("leave the tag out: the format says what each value is"));
    }
  }

  private void close() {
    Frame frame = open.pop();
    if (!frame.mapping()) {
      add(new YamlNode.Sequence(frame.place(), frame.children()));
      return;
    }
    List<YamlNode.Entry> entries = new ArrayList<>();
    for (int i = 0; i + 1 < frame.children().size(); i += 2) {
      entries.add(new YamlNode.Entry(frame.children().get(i), frame.children().get(i + 1)));
    }
    add(new YamlNode.Mapping(frame.place(), entries));
  }

  private void add(YamlNode node) {
    if (open.isEmpty()) {
      root = node;
    } else {
      open.peek().children().add(node);
    }
  }

  private Place place(Mark mark) {
    return new Place(reading.source().name(), mark.getLine() + 1, mark.getColumn() + 1);
  }
}
