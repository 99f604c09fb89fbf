package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Holds a document against its JSON Schema and says every difference in plain words. It walks the
 * schema file itself, so the two cannot drift apart, and knows the keywords that our schemas use:
 * {@code type, properties, required, additionalProperties, items, enum, const, oneOf} (by type),
 * bounds of numbers, lists and texts, {@code $ref} into {@code $defs}; {@code title} as the thing's
 * name in sentences, {@code x-unit} as its unit, {@code x-numbers} for points. A field that is null
 * counts as absent.
 */
final class SchemaWalk {
  private static final JsonNode PLAN = load("plan");
  private final JsonNode schema;
  private final boolean draft;
  private final Map<JsonNode, Integer> lengths;
  private final List<Fault> faults = new ArrayList<>();

  private SchemaWalk(JsonNode schema, boolean draft, Map<JsonNode, Integer> lengths) {
    this.schema = schema;
    this.draft = draft;
    this.lengths = lengths;
  }

  /**
   * The faults of a plan document.
   *
   * @param plan the document
   * @param lengths the true length of lists that were cut off
   * @param draft whether completeness and the range of numbers are left unchecked
   */
  static List<Fault> faults(JsonNode plan, Map<JsonNode, Integer> lengths, boolean draft) {
    SchemaWalk walk = new SchemaWalk(PLAN, draft, lengths);
    walk.value(plan, PLAN, "", "The plan");
    return walk.faults;
  }

  private static JsonNode load(String name) {
    String place = "/spanwright/shared/schema/" + name + ".schema.json";
    try (InputStream in = SchemaWalk.class.getResourceAsStream(place)) {
      if (in == null) {
        throw new IllegalStateException(place + " is not on the class path");
      }
      return Json.mapper().readTree(in);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + place, e);
    }
  }

  private void say(String path, Wording wording, Object... parts) {
    faults.add(Fault.of(path, wording, parts));
  }

  private JsonNode resolved(JsonNode part) {
    String ref = part.path("$ref").asText("");
    return ref.isEmpty() ? part : schema.at(ref.substring(1));
  }

  private void value(JsonNode value, JsonNode part, String path, String label) {
    value(value, part, path, label, "");
  }

  private void value(JsonNode value, JsonNode part, String path, String label, String called) {
    JsonNode form = resolved(part);
    String title = part.path("title").asText(form.path("title").asText(called));
    if (form.has("oneOf")) {
      choice(value, form, path, label, title);
    } else if (form.has("x-numbers")) {
      point(value, form, path, label, title);
    } else if (!fits(value, form)) {
      wrongType(value, form, path, label, title);
    } else {
      switch (form.path("type").asText()) {
        case "object" -> object(value, form, path, label);
        case "array" -> list(value, form, path, label, title);
        case "string" -> text(value.asText(), form, path, label, title);
        case "number", "integer" -> number(value.asDouble(), form, path, label, title);
        default -> {} // true and false are both right
      }
    }
  }

  private static boolean fits(JsonNode value, JsonNode form) {
    return switch (form.path("type").asText()) {
      case "object" -> value.isObject();
      case "array" -> value.isArray();
      case "string" -> value.isTextual();
      case "number" -> value.isNumber();
      case "integer" -> value.isNumber();
      case "boolean" -> value.isBoolean();
      default -> false;
    };
  }

  private void choice(JsonNode value, JsonNode form, String path, String label, String title) {
    List<String> kinds = new ArrayList<>();
    for (JsonNode option : form.path("oneOf")) {
      if (fits(value, option)) {
        value(value, option, path, label, title);
        return;
      }
      kinds.add(kind(option));
    }
    say(path, Wording.MUST_BE, label, title, Wording.either(kinds), found(value));
  }

  private void object(JsonNode value, JsonNode form, String path, String label) {
    JsonNode properties = form.path("properties");
    JsonNode others = form.path("additionalProperties");
    for (Map.Entry<String, JsonNode> field : value.properties()) {
      String name = field.getKey();
      String inner = Paths.field(path, name);
      JsonNode part = properties.path(name);
      if (part.isMissingNode() && others.isObject()) {
        String title = others.path("title").asText() + " of " + Wording.quoted(name);
        if (!field.getValue().isNumber()) {
          wrongType(field.getValue(), others, inner, label, title);
        } else {
          number(field.getValue().asDouble(), others, inner, label, title);
        }
      } else if (part.isMissingNode()) {
        unknown(name, properties, inner, label);
      } else if (!field.getValue().isNull()) {
        boolean chapter = path.isEmpty() && part.path("type").asText().equals("object");
        value(
            field.getValue(), part, inner, chapter ? capital(part.path("title").asText()) : label);
      }
    }
    if (!draft) {
      for (JsonNode name : form.path("required")) {
        if (value.path(name.asText()).isMissingNode() || value.path(name.asText()).isNull()) {
          JsonNode part = properties.path(name.asText());
          missing(name.asText(), part, path, label);
        }
      }
    }
  }

  private void unknown(String name, JsonNode properties, String path, String label) {
    String shown = Wording.clean(name);
    String near = null;
    int least = 3;
    for (Map.Entry<String, JsonNode> known : properties.properties()) {
      int steps = Spelling.steps(name, known.getKey());
      if (steps < least && steps < known.getKey().length() / 2 + 1) {
        least = steps;
        near = known.getKey();
      }
    }
    if (near == null) {
      say(path, Wording.UNKNOWN_FIELD, label, shown);
    } else {
      say(path, Wording.UNKNOWN_FIELD_LIKE, label, shown, near);
    }
  }

  private void missing(String name, JsonNode part, String path, String label) {
    JsonNode form = resolved(part);
    String title = part.path("title").asText(form.path("title").asText());
    String meaning = part.path("description").asText(form.path("description").asText());
    String wanted = kind(form) + (meaning.isEmpty() ? "" : " (" + meaning + ")");
    say(Paths.field(path, name), Wording.MISSING, label, name, title, wanted);
  }

  private void list(JsonNode value, JsonNode form, String path, String label, String title) {
    int length = lengths.getOrDefault(value, value.size());
    int most = form.path("maxItems").asInt(Integer.MAX_VALUE);
    int least = form.path("minItems").asInt(0);
    if (length > most) {
      say(path, Wording.TOO_MANY, label, title, length, most);
      return;
    }
    JsonNode items = resolved(form.path("items"));
    if (length < least && !draft && !items.has("x-numbers")) {
      say(path, Wording.TOO_FEW, label, title, least, length);
    }
    for (int i = 0; i < value.size(); i++) {
      JsonNode entry = value.get(i);
      String inner = Paths.entry(path, i);
      if (items.path("type").asText().equals("object") && !entry.isObject()) {
        String thing = label(items.path("title").asText(), entry, i);
        say(inner, Wording.MUST_BE, thing, "it", kind(items), found(entry));
      } else if (items.path("type").asText().equals("object")) {
        value(entry, form.path("items"), inner, label(items.path("title").asText(), entry, i));
      } else if (items.has("x-numbers")) {
        point(entry, items, inner, label, "point " + (i + 1) + " of " + title);
      } else {
        value(entry, form.path("items"), inner, label);
      }
    }
  }

  /** What a thing in a list is called in sentences: its kind and the name its author gave it. */
  static String label(String kind, JsonNode thing, int index) {
    String name = thing.path("name").asText("");
    String shown = name.isBlank() ? thing.path("id").asText("") : name;
    return capital(kind)
        + " "
        + (shown.isBlank() ? String.valueOf(index + 1) : Wording.quoted(shown));
  }

  static String capital(String words) {
    return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }

  private void point(JsonNode value, JsonNode form, String path, String label, String title) {
    int numbers = form.path("x-numbers").asInt();
    boolean right = value.isArray() && value.size() == numbers;
    for (JsonNode number : value) {
      right &= number.isNumber();
    }
    if (!right) {
      say(path, Wording.MUST_BE, label, title, pointKind(form), pointFound(value));
      return;
    }
    for (JsonNode number : value) {
      if (!ordinate(number.asDouble(), form, path, label, title)) {
        return;
      }
    }
  }

  /** One number of a point, or an end of a range; false when a fault was said. */
  private boolean ordinate(double value, JsonNode form, String path, String label, String title) {
    JsonNode items = form.path("items");
    double least = items.path("minimum").asDouble();
    double most = items.path("maximum").asDouble();
    if (!Double.isFinite(value)) {
      say(path, Wording.NOT_FINITE, label, title);
    } else if (value >= least && value <= most) {
      return true;
    } else if (items.has("x-unit")) {
      say(path, Wording.FAR_AWAY, label, title, value);
    } else if (draft) {
      return true;
    } else {
      String range =
          range(items.path("exclusiveMinimum"), items.path("minimum"), items.path("maximum"));
      say(path, Wording.MUST_BE, label, title, range, value);
    }
    return false;
  }

  private static String pointKind(JsonNode form) {
    if (!form.path("items").has("x-unit")) {
      return "[least, most], two numbers";
    }
    return form.path("x-numbers").asInt() == 2
        ? "[x, y], two numbers in metres"
        : "[x, y, z], three numbers in metres";
  }

  private static String pointFound(JsonNode value) {
    return value.isArray() ? "a list of " + value.size() + listed(value) : found(value);
  }

  private static String listed(JsonNode value) {
    for (JsonNode entry : value) {
      if (!entry.isNumber()) {
        return " with " + found(entry) + " in it";
      }
    }
    return value.size() == 1 ? " number" : " numbers";
  }

  private void text(String text, JsonNode form, String path, String label, String title) {
    if (form.has("const") && !form.path("const").asText().equals(text)) {
      String wanted = form.path("const").asText();
      say(path, Wording.WRONG_FORMAT, label, title, wanted, Wording.quoted(text));
      return;
    }
    if (form.has("enum")) {
      List<String> words = new ArrayList<>();
      form.path("enum").forEach(word -> words.add(word.asText()));
      if (!words.contains(text)) {
        say(path, Wording.MUST_BE, label, title, words(form), "the text " + Wording.quoted(text));
      }
      return;
    }
    int length = text.codePointCount(0, text.length());
    int most = form.path("maxLength").asInt(Integer.MAX_VALUE);
    if (length > most) {
      say(path, Wording.TOO_LONG, label, title, length, most);
    }
    if (text.isBlank() && form.path("minLength").asInt() > 0 && !draft) {
      say(path, Wording.NOTHING_WRITTEN, label, title);
    }
    boolean lineBreaks = !form.path("pattern").asText().contains("\\u0000-\\u001f");
    int forbidden = Texts.findForbidden(text, lineBreaks);
    if (forbidden >= 0) {
      int codePoint = text.codePointAt(text.offsetByCodePoints(0, forbidden));
      String code = String.format("%04X", codePoint);
      say(path, Wording.CONTROL_CHARACTER, label, title, code, forbidden + 1);
    }
  }

  private void number(double number, JsonNode form, String path, String label, String title) {
    if (!Double.isFinite(number)) {
      say(path, Wording.NOT_FINITE, label, title);
      return;
    }
    boolean integer = form.path("type").asText().equals("integer");
    if (integer && number != Math.rint(number)) {
      say(path, Wording.NOT_WHOLE, label, title, number);
      return;
    }
    JsonNode above = form.path("exclusiveMinimum");
    JsonNode least = form.path("minimum");
    JsonNode most = form.path("maximum");
    boolean out =
        (above.isNumber() && number <= above.asDouble())
            || (least.isNumber() && number < least.asDouble())
            || (most.isNumber() && number > most.asDouble());
    // frequencies have sentences of their own, for hertz and kilohertz
    boolean elsewhere = form.path("x-unit").asText().equals("MHz");
    if (out && !draft && !elsewhere) {
      String range = range(above, least, most) + unit(form);
      say(path, Wording.MUST_BE, label, title, range, Wording.number(number) + unit(form));
    }
  }

  private static String range(JsonNode above, JsonNode least, JsonNode most) {
    String upper = most.isNumber() ? Wording.number(most.asDouble()) : null;
    if (above.isNumber()) {
      String lower = "above " + Wording.number(above.asDouble());
      return upper == null ? lower : lower + " and at most " + upper;
    }
    if (!least.isNumber()) {
      return "at most " + upper;
    }
    String lower = Wording.number(least.asDouble());
    return upper == null ? "at least " + lower : "between " + lower + " and " + upper;
  }

  private void wrongType(JsonNode value, JsonNode form, String path, String label, String title) {
    boolean digits =
        form.path("type").asText().matches("number|integer")
            && value.isTextual()
            && value.asText().strip().matches("[-+]?[0-9].*");
    Wording wording = digits ? Wording.NUMBER_IN_QUOTES : Wording.MUST_BE;
    say(path, wording, label, title, kind(form), found(value));
  }

  private static String unit(JsonNode form) {
    return form.has("x-unit") ? " " + form.path("x-unit").asText() : "";
  }

  private String kind(JsonNode form) {
    if (form.has("x-numbers")) {
      return pointKind(form);
    }
    if (form.has("enum")) {
      return words(form);
    }
    return switch (form.path("type").asText()) {
      case "object" -> "an object in braces";
      case "array" -> "a list in square brackets";
      case "string" -> "a text in quotes";
      case "integer" -> "a whole number";
      case "boolean" -> "true or false";
      default -> "a number" + (form.has("x-unit") ? " in " + form.path("x-unit").asText() : "");
    };
  }

  private static String words(JsonNode form) {
    List<String> words = new ArrayList<>();
    form.path("enum").forEach(word -> words.add(word.asText()));
    return (words.size() == 1 ? "the word " : "one of ") + Wording.either(words);
  }

  static String found(JsonNode value) {
    if (value.isTextual()) {
      return "the text " + Wording.quoted(value.asText());
    }
    if (value.isNumber()) {
      return "the number " + Wording.number(value.asDouble());
    }
    return value.isArray() ? "a list" : value.isObject() ? "an object" : value.asText();
  }
}
