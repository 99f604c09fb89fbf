package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.plan.Fault;

/** Finds numbers that are none. */
final class Finite {
  private Finite() {}

  /** A fault for each number in the tree that is not finite. */
  static List<Fault> faults(JsonNode tree) {
    List<Fault> faults = new ArrayList<>();
    walk(tree, "", faults);
    return faults;
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
