package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import spanwright.plan.Fault;
import spanwright.plan.Place;

/**
 * One object of a document, read field by field. Each fault is noted with its path and reading goes
 * on with a stand-in, so that all of them are found; whoever reads must ask {@link #finish} of
 * every form and look at the faults before using anything.
 */
public final class Form {
  /** Coordinates further out than this are not of a plot [m]. */
  public static final double FARTHEST = 1e5;

  private final JsonNode node;
  private final String path;
  private final List<Fault> faults;
  private final Set<String> known = new HashSet<>();

  private Form(JsonNode node, String path, List<Fault> faults) {
    this.node = node;
    this.path = path;
    this.faults = faults;
    if (!node.isObject()) {
      note("", "this must be an object in braces.");
    }
  }

  /** The whole document. */
  public static Form of(JsonNode tree, List<Fault> faults) {
    return new Form(tree, "", faults);
  }

  /** An object inside a document. */
  public static Form at(String path, JsonNode node, List<Fault> faults) {
    return new Form(node, path, faults);
  }

  /** Whether the field is there; null counts as absent. */
  public boolean has(String name) {
    known.add(name);
    return node.hasNonNull(name);
  }

  /** Whether the field is there and a text, for fields that may be a word or an object. */
  public boolean isText(String name) {
    return has(name) && node.get(name).isTextual();
  }

  /** Whether the field is there and a number. */
  public boolean isNumber(String name) {
    return has(name) && node.get(name).isNumber();
  }

  /** A number that must be there. */
  public double number(String name, double least, double most, String unit) {
    if (!has(name)) {
      note(name, "this is missing. Give a number" + in(unit) + ".");
      return least;
    }
    return number(node.get(name), name, least, most, unit);
  }

  /** A number that may be absent. */
  public Double number(String name, double least, double most, String unit, Double absent) {
    return has(name) ? Double.valueOf(number(node.get(name), name, least, most, unit)) : absent;
  }

  private double number(JsonNode value, String name, double least, double most, String unit) {
    if (!value.isNumber()) {
      note(name, "this must be a number" + in(unit) + ".");
      return least;
    }
    double found = value.doubleValue();
    if (!(found >= least && found <= most)) {
      String shown = Double.isInfinite(found) ? "a number too large to reckon with" : plain(found);
      note(
          name,
          "this is "
              + shown
              + "; it must be from "
              + plain(least)
              + " to "
              + plain(most)
              + (unit.isEmpty() ? "" : " " + unit)
              + "."
              + hertz(found, most, unit));
      return least;
    }
    return found;
  }

  private static String hertz(double found, double most, String unit) {
    boolean fits = unit.equals("MHz") && found > most && found / 1e6 <= most;
    return fits ? " It looks like hertz: " + plain(found / 1e6) + " MHz?" : "";
  }

  /** A whole number that must be there. */
  public int index(String name, int most) {
    double value = number(name, 0, most, "");
    if (value != Math.rint(value)) {
      note(name, "this must be a whole number, counted from 0.");
      return 0;
    }
    return (int) value;
  }

  /** A whole number that may be absent. */
  public long whole(String name, double least, double most, long absent) {
    double value = number(name, least, most, "", (double) absent);
    if (value != Math.rint(value)) {
      note(name, "this must be a whole number.");
      return absent;
    }
    return (long) value;
  }

  /** A word out of a few. */
  public <E> E word(String name, Map<String, E> words, E absent) {
    if (!has(name)) {
      if (absent == null) {
        note(name, "this is missing. Say one of " + listed(words) + ".");
      }
      return absent;
    }
    E meant = node.get(name).isTextual() ? words.get(node.get(name).textValue()) : null;
    if (meant == null) {
      note(name, "this must be one of " + listed(words) + ".");
    }
    return meant;
  }

  private static String listed(Map<String, ?> words) {
    return String.join(", ", words.keySet().stream().sorted().toList());
  }

  /** A text that must be there. */
  public String text(String name) {
    if (!has(name) || !node.get(name).isTextual()) {
      note(name, "this must be a text in double quotes.");
      return "";
    }
    return node.get(name).textValue();
  }

  /** An object; when it is missing or none, a form with nothing in it. */
  public Form form(String name) {
    if (!has(name)) {
      note(name, "this is missing. Give an object in braces.");
      return new Form(JsonNodeFactory.instance.objectNode(), at(name), new ArrayList<>());
    }
    return new Form(node.get(name), at(name), faults);
  }

  /** A list of objects. */
  public <T> List<T> forms(String name, int least, int most, Function<Form, T> reader) {
    List<T> all = new ArrayList<>();
    JsonNode list = list(name, least, most);
    for (int i = 0; i < list.size(); i++) {
      Form each = new Form(list.get(i), at(name) + "[" + i + "]", faults);
      all.add(reader.apply(each));
    }
    return all;
  }

  /** A list of numbers. */
  public double[] numbers(
      String name, int fewest, int longest, double least, double most, String unit) {
    JsonNode list = list(name, fewest, longest);
    double[] all = new double[list.size()];
    for (int i = 0; i < all.length; i++) {
      all[i] = number(list.get(i), name + "[" + i + "]", least, most, unit);
    }
    return all;
  }

  /** A place that must be there. */
  public Place place(String name) {
    has(name);
    return place(node.path(name), name);
  }

  /** A list of places. */
  public List<Place> places(String name, int fewest, int longest) {
    JsonNode list = list(name, fewest, longest);
    List<Place> all = new ArrayList<>();
    for (int i = 0; i < list.size(); i++) {
      all.add(place(list.get(i), name + "[" + i + "]"));
    }
    return all;
  }

  private Place place(JsonNode value, String name) {
    if (!value.isArray() || value.size() != 3) {
      note(name, "this must be a place [x, y, z] in metres.");
      return new Place(0, 0, 0);
    }
    double[] xyz = new double[3];
    for (int i = 0; i < 3; i++) {
      xyz[i] = number(value.get(i), name + "[" + i + "]", -FARTHEST, FARTHEST, "m");
    }
    return new Place(xyz[0], xyz[1], xyz[2]);
  }

  private JsonNode list(String name, int fewest, int longest) {
    JsonNode none = JsonNodeFactory.instance.arrayNode();
    if (!has(name)) {
      if (fewest > 0) {
        note(name, "this is missing. Give a list in brackets.");
      }
      return none;
    }
    JsonNode list = node.get(name);
    if (!list.isArray()) {
      note(name, "this must be a list in brackets.");
      return none;
    }
    if (list.size() < fewest || list.size() > longest) {
      String takes = fewest == longest ? plain(fewest) : fewest + " to " + longest;
      note(name, "this list has " + list.size() + " entries; it takes " + takes + ".");
      return none;
    }
    return list;
  }

  /** Notes every field that nobody asked about. */
  public void finish() {
    node.fieldNames()
        .forEachRemaining(
            name -> {
              if (!known.contains(name)) {
                String shown = name.length() > 60 ? name.substring(0, 60) + "…" : name;
                String[] sorted = known.stream().sorted().toArray(String[]::new);
                note(
                    shown,
                    "this is not known here; remove it. Known are "
                        + String.join(", ", Arrays.asList(sorted))
                        + ".");
              }
            });
  }

  /** Notes a fault at a field of this object, or at the object itself when the name is empty. */
  public void note(String name, String message) {
    String upper = message.substring(0, 1).toUpperCase(Locale.ROOT) + message.substring(1);
    faults.add(new Fault(at(name), upper));
  }

  private String at(String name) {
    if (name.isEmpty() || path.isEmpty()) {
      return path + name;
    }
    return path + "." + name;
  }

  private static String in(String unit) {
    return unit.isEmpty() ? "" : " in " + unit;
  }

  static String plain(double value) {
    boolean whole = value == Math.rint(value) && Math.abs(value) < 1e12;
    return whole
        ? String.format(Locale.ROOT, "%.0f", value)
        : String.format(Locale.ROOT, "%.6g", value)
            .replaceFirst("(\\.\\d*?)0+(e.*)?$", "$1$2")
            .replaceFirst("\\.(e.*)?$", "$1");
  }
}
