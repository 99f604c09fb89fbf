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
import jdk.jfr.consumer.RecordingFile;

/** Where the time goes: methods by how often they were found on the stack. */
final class Profiles {
  private static final int MOST = 20;

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
      Samples samples = samples(file);
      String name = folder.relativize(file).getName(0).toString();
      text.append(String.format(Locale.ROOT, "%n%s, %d samples%n", name, samples.count));
      text.append("\n  at the top of the stack\n\n");
      list(text, samples.top, samples.count);
      text.append("\n  anywhere on it\n\n");
      list(text, samples.anywhere, samples.count);
    }
    return text.toString();
  }

  private static void list(StringBuilder text, Map<String, Integer> methods, int count) {
    methods.entrySet().stream()
        .filter(method -> method.getValue() < 0.97 * count)
        .sorted(Map.Entry.<String, Integer>comparingByValue(Comparator.reverseOrder()))
        .limit(MOST)
        .forEach(
            method ->
                text.append(
                    String.format(
                        Locale.ROOT,
                        "    %5.1f %%  %s%n",
                        100.0 * method.getValue() / count,
                        method.getKey())));
  }

  private static final class Samples {
    final Map<String, Integer> top = new HashMap<>();
    final Map<String, Integer> anywhere = new HashMap<>();
    int count;

    void add(List<RecordedFrame> frames) {
      count++;
      top.merge(name(frames.get(0)), 1, Integer::sum);
      frames.stream()
          .filter(f -> f.getMethod().getType().getName().startsWith("spanwright."))
          .filter(f -> !f.getMethod().getType().getName().contains("Bench"))
          .map(Samples::name)
          .filter(method -> Character.isLetter(method.charAt(0)) && !method.contains("lambda$"))
          .distinct()
          .forEach(method -> anywhere.merge(method, 1, Integer::sum));
    }

    private static String name(RecordedFrame frame) {
      String type = frame.getMethod().getType().getName();
      return type.substring(type.lastIndexOf('.') + 1) + "." + frame.getMethod().getName();
    }
  }

  private static Samples samples(Path file) throws IOException {
    Samples samples = new Samples();
    try (RecordingFile recording = new RecordingFile(file)) {
      while (recording.hasMoreEvents()) {
        RecordedEvent event = recording.readEvent();
        boolean sample = event.getEventType().getName().equals("jdk.ExecutionSample");
        if (sample && event.getStackTrace() != null && onBenchmark(event)) {
          samples.add(event.getStackTrace().getFrames());
        }
      }
    }
    return samples;
  }

  private static boolean onBenchmark(RecordedEvent event) {
    return event.getStackTrace().getFrames().stream()
        .anyMatch(f -> f.getMethod().getType().getName().startsWith("spanwright."));
  }
}
