package spanwright.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import jdk.jfr.consumer.RecordedEvent;
import jdk.jfr.consumer.RecordedFrame;
import jdk.jfr.consumer.RecordedMethod;
import jdk.jfr.consumer.RecordingFile;

/** Where the time goes: methods by how often they were found at the top of the stack. */
final class Profiles {
  private static final int MOST = 10;

  private Profiles() {}

  /** Deletes the recordings of an earlier run. */
  static void forget(Path folder) throws IOException {
    for (Path file : recordings(folder)) {
      Files.delete(file);
    }
  }

  private static List<Path> recordings(Path folder) throws IOException {
    if (!Files.isDirectory(folder)) {
      return List.of();
    }
    try (Stream<Path> all = Files.walk(folder)) {
      return all.filter(file -> file.toString().endsWith(".jfr")).sorted().toList();
    }
  }

  static String text(Path folder) throws IOException {
    StringBuilder text = new StringBuilder();
    for (Path file : recordings(folder)) {
      Map<String, Integer> found = samples(file);
      int all = found.values().stream().mapToInt(Integer::intValue).sum();
      String name = folder.relativize(file).getName(0).toString();
      text.append(String.format(Locale.ROOT, "%n%s, %d samples%n%n", name, all));
      found.entrySet().stream()
          .sorted(Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder()))
          .limit(MOST)
          .forEach(
              method ->
                  text.append(
                      String.format(
                          Locale.ROOT,
                          "    %5.1f %%  %s%n",
                          100.0 * method.getValue() / all,
                          method.getKey())));
    }
    return text.toString();
  }

  private static Map<String, Integer> samples(Path file) throws IOException {
    Map<String, Integer> found = new HashMap<>();
    try (RecordingFile recording = new RecordingFile(file)) {
      while (recording.hasMoreEvents()) {
        RecordedEvent event = recording.readEvent();
        boolean sample = event.getEventType().getName().equals("jdk.ExecutionSample");
        if (sample && event.getStackTrace() != null) {
          List<RecordedFrame> frames = event.getStackTrace().getFrames();
          if (!frames.isEmpty()) {
            RecordedMethod method = frames.get(0).getMethod();
            String type = method.getType().getName();
            String name = type.substring(type.lastIndexOf('.') + 1) + "." + method.getName();
            found.merge(name, 1, Integer::sum);
          }
        }
      }
    }
    return found;
  }
}
