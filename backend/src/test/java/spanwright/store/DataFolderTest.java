package spanwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Where plans go by the conventions of each system. */
class DataFolderTest {
  @Test
  void linux_follows_the_base_directory_convention() {
    assertEquals(
        Path.of("/home/u/.local/share/spanwright"), DataFolder.usual("Linux", "/home/u", Map.of()));
    assertEquals(
        Path.of("/data/spanwright"),
        DataFolder.usual("Linux", "/home/u", Map.of("XDG_DATA_HOME", "/data")));
    assertEquals(
        Path.of("/home/u/.local/share/spanwright"),
        DataFolder.usual("Linux", "/home/u", Map.of("XDG_DATA_HOME", "not/absolute")));
  }

  @Test
  void macos_has_application_support() {
    assertEquals(
        Path.of("/Users/u/Library/Application Support/Spanwright"),
        DataFolder.usual("Mac OS X", "/Users/u", Map.of("XDG_DATA_HOME", "/data")));
  }

  @Test
  void windows_has_its_application_data() {
    assertEquals(
        Path.of("/roaming/Spanwright"),
        DataFolder.usual("Windows 11", "/users/u", Map.of("APPDATA", "/roaming")));
    assertEquals(
        Path.of("/users/u/AppData/Roaming/Spanwright"),
        DataFolder.usual("Windows 11", "/users/u", Map.of()));
  }
}
