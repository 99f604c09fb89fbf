package spanwright.store;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where plans are kept when nobody says otherwise: the user's data directory of the system. */
public final class DataFolder {
  private DataFolder() {}

  /** On this machine, for this user. */
  public static Path usual() {
    return usual(System.getProperty("os.name"), System.getProperty("user.home"), System.getenv());
  }

  /** By the convention of the named system: XDG base directories, Application Support, AppData. */
  static Path usual(String system, String home, Map<String, String> environment) {
    String name = system.toLowerCase(Locale.ROOT);
    if (name.contains("win") && !name.contains("darwin")) {
      String set = environment.get("APPDATA");
      Path base = isSet(set) ? Path.of(set) : Path.of(home, "AppData", "Roaming");
      return base.resolve("Spanwright");
    }
    if (name.contains("mac") || name.contains("darwin")) {
      return Path.of(home, "Library", "Application Support", "Spanwright");
    }
    String set = environment.get("XDG_DATA_HOME");
    // The convention says that a relative path there is to be ignored.
    boolean usable = isSet(set) && Path.of(set).isAbsolute();
    Path base = usable ? Path.of(set) : Path.of(home, ".local", "share");
    return base.resolve("spanwright");
  }

  private static boolean isSet(String value) {
    return value != null && !value.isBlank();
  }
}
