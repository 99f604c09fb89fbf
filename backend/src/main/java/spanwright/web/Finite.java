package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.plan.Fault;
import spanwright.plan.Json;

/** Finds numbers that are none. */
public final class Finite {
  private Finite() {}

  /** A fault for each number in the tree that is not finite. */
  public static List<Fault> faults(JsonNode tree) {
    List<Fault> faults = new ArrayList<>();
    walk(tree, "", faults);
    return faults;
  }

  /** The document as a tree; a number that is none must never leave the program. */
  public static JsonNode tree(Object document) {
    JsonNode tree = Json.mapper().valueToTree(document);
    List<Fault> faults = faults(tree);
    if (!faults.isEmpty()) {
      throw new IllegalStateException("not finite: " + faults.get(0).path());
    }
    return tree;
  }

  private static void walk(JsonNode node, String path, List<Fault> faults) {
    if (node.isNumber() && !Double.isFinite(node.doubleValue())) {
      faults.add(new Fault(path, "The number is not finite."));
    }
    if (node.isArray()) {
      for (int i = 0; i < node.size(); i++) {
        walk(node.get(i), path + "[" + i + "]", faults);
      }
    }
    for (Map.Entry<String, JsonNode> field : node.properties()) {
      walk(field.getValue(), path.isEmpty() ? field.getKey() : path + "." + field.getKey(), faults);
    }
  }
}
