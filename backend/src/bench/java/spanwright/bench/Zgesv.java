package spanwright.bench;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * LAPACK's zgesv as NumPy calls it, on the core this process runs on.
 *
 * @param microseconds by size; empty where there is no such Python
 */
record Zgesv(Map<Integer, Double> microseconds) {
  static Zgesv measure(String python, Path script, Collection<Integer> sizes) {
    Map<Integer, Double> found = new HashMap<>();
    if (python.equals("none")) {
      return new Zgesv(found);
    }
    List<String> command = new ArrayList<>(List.of(python, script.toString()));
    sizes.forEach(size -> command.add(Integer.toString(size)));
    try {
      Process process =
          new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.DISCARD).start();
      String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
      out.lines()
          .map(line -> line.split(" "))
          .forEach(pair -> found.put(Integer.valueOf(pair[0]), Double.valueOf(pair[1])));
    } catch (IOException e) {
      System.err.println("No zgesv beside it: " + python + " cannot be started.");
    }
    return new Zgesv(found);
  }

  /** The lesser of two looks, before and after; not a number when there is neither. */
  static double of(Zgesv before, Zgesv after, int size) {
    Double one = before.microseconds.get(size);
    Double two = after.microseconds.get(size);
    return one == null || two == null ? Double.NaN : Math.min(one, two);
  }
}
