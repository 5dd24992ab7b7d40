package weighhouse.quantity.vocabulary;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.Node;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Role;
import weighhouse.quantity.TimeUnit;

/** Reads vocabulary files; the form is told at the top of {@code rules/vocabulary.yaml}. */
public final class VocabularyReader {
  private static final String SHIPPED = "/rules/vocabulary.yaml";
  private static final Set<String> GLUE = Set.of("per", "over", "people");

  private final Vocabulary vocabulary = new Vocabulary();
  private final List<String> faults = new ArrayList<>();
  private YamlNodes yaml;

  private VocabularyReader() {}

  private static final class Shipped {
    static final Vocabulary VOCABULARY = load();

    private static Vocabulary load() {
      try {
        VocabularyReader reader = new VocabularyReader();
        reader.readShipped();
        return reader.finish();
      } catch (VocabularyException e) {
        throw new IllegalStateException(e);
      }
    }
  }

  /** The words that come with the program. */
  public static Vocabulary shipped() {
    return Shipped.VOCABULARY;
  }

  /**
   * The words that come with the program and those of a user's file.
   *
   * @param name the file's name for messages
   * @param text its content
   * @throws VocabularyException with all faults of the file
   */
  public static Vocabulary extended(String name, String text) throws VocabularyException {
    VocabularyReader reader = new VocabularyReader();
    reader.readShipped();
    reader.read(name, text);
    return reader.finish();
  }

  private void readShipped() {
    try (InputStream in = VocabularyReader.class.getResourceAsStream(SHIPPED)) {
      read("vocabulary.yaml", new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private Vocabulary finish() throws VocabularyException {
    if (!faults.isEmpty()) {
      throw new VocabularyException(faults);
    }
    return vocabulary;
  }

  private void read(String name, String text) {
    yaml = new YamlNodes(name);
    yaml.compose(text)
        .ifPresent(
            root ->
                yaml.entries(
                    root,
                    (key, value) -> {
                      if (yaml.text(key).equals("field")) {
                        yaml.entries(value, this::field);
                      } else {
                        yaml.entries(value, this::section);
                      }
                    }));
    faults.addAll(yaml.faults());
  }

  private void section(Node key, Node value) {
    switch (yaml.text(key)) {
      case "kinds" -> yaml.entries(value, this::kind);
      case "roles" -> yaml.entries(value, this::role);
      case "units" -> yaml.entries(value, this::unit);
      case "glue" -> yaml.entries(value, this::glue);
      case "nothing" ->
          yaml.texts(value)
              .forEach(p -> vocabulary.senses.kind(p, new Sense(Kind.UNKNOWN, Strength.WEAK, 1)));
      default -> yaml.fault(key, "no such section");
    }
  }

  private void kind(Node key, Node value) {
    Kind kind = constant(Kind.class, key);
    if (kind == null) {
      return;
    }
    yaml.entries(
        value,
        (level, phrases) -> {
          boolean parts = yaml.text(level).equals("parts");
          Strength strength = parts ? Strength.CLEAR : constant(Strength.class, level);
          for (String phrase : strength == null ? List.<String>of() : yaml.texts(phrases)) {
            Sense sense = new Sense(kind, strength, Words.of(phrase).size());
            if (parts) {
              vocabulary.senses.part(phrase, sense);
            } else {
              vocabulary.senses.kind(phrase, sense);
            }
          }
        });
  }

  private void role(Node key, Node value) {
    Role role = yaml.text(key).equals("parameter") ? null : constant(Role.class, key);
    Figure figure = new Figure(role);
    yaml.entries(
        value,
        (level, phrases) -> {
          switch (yaml.text(level)) {
            case "sure" -> yaml.texts(phrases).forEach(p -> vocabulary.figures.sure(p, figure));
            case "bare" -> yaml.texts(phrases).forEach(p -> vocabulary.figures.bare(p, figure));
            default -> yaml.fault(level, "expected sure or bare");
          }
        });
  }

  private void unit(Node key, Node value) {
    TimeUnit unit = constant(TimeUnit.class, key);
    yaml.entries(
        value,
        (form, words) -> {
          switch (yaml.text(form)) {
            case "one" -> yaml.texts(words).forEach(w -> vocabulary.spans.unit(w, unit));
            case "every" -> yaml.texts(words).forEach(w -> vocabulary.spans.adjective(w, unit));
            default -> yaml.fault(form, "expected one or every");
          }
        });
  }

  private void glue(Node key, Node value) {
    String group = yaml.text(key);
    if (group.equals("of")) {
      yaml.texts(value).forEach(vocabulary.senses::complement);
    } else if (group.equals("compares")) {
      yaml.texts(value).forEach(phrase -> vocabulary.comparisons.add(phrase, phrase));
    } else if (GLUE.contains(group)) {
      yaml.texts(value).forEach(word -> vocabulary.spans.glue(group, word));
    } else {
      yaml.fault(key, "expected per, over, people, of or compares");
    }
  }

  private void field(Node key, Node value) {
    String side = yaml.text(key);
    if (!side.equals("for") && !side.equals("against")) {
      yaml.fault(key, "expected for or against");
    }
    for (Node item : yaml.items(value)) {
      FieldGroup group = new FieldGroup(yaml, side.equals("for") ? 1 : -1);
      group.read(item, vocabulary.field);
    }
  }

  private <E extends Enum<E>> E constant(Class<E> type, Node node) {
    String text = yaml.text(node);
    for (E constant : type.getEnumConstants()) {
      if (constant.name().equals(text.toUpperCase(Locale.ROOT).replace(' ', '_'))) {
        return constant;
      }
    }
    yaml.fault(node, "no such " + type.getSimpleName().toLowerCase(Locale.ROOT) + ": " + text);
    return null;
  }
}
