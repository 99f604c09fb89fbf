package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import spanwright.BrokenPlans;
import spanwright.plan.Fault;

/** What is said of text that is not JSON. */
class JsonTextTest {
  private static Fault fault(String text) {
    return assertThrows(BadJson.class, () -> JsonText.read(text)).fault();
  }

  @Test
  void a_document_is_read_whole_and_a_byte_order_mark_forgiven() throws BadJson {
    assertEquals(2, JsonText.read("{\"a\":[1,2]}").get("a").size());
    assertEquals(7, JsonText.read("\uFEFF7").asInt());
  }

  @Test
  void a_fault_tells_line_and_column() {
    assertEquals("line 2, column 5", fault("{\n\"a\":,\n}").path());
  }

  @Test
  void each_kind_of_fault_has_its_sentence() {
    assertTrue(fault("").message().contains("the text is empty"));
    assertTrue(fault("{\"a\":1").message().contains("ends before the JSON does"));
    assertTrue(fault("{\"a\":1,\"a\":2}").message().contains("\"a\" stands twice"));
    assertTrue(fault("[NaN]").message().contains("\"NaN\" is not a number in JSON"));
    assertTrue(fault("[yes]").message().contains("\"yes\" is not JSON"));
    assertTrue(fault("[1}").message().contains("closes what was not opened"));
    assertTrue(fault("[1] [2]").message().contains("Something follows"));
    assertTrue(fault("[\"a\nb\"]").message().contains("control character"));
    assertTrue(fault("[#]").message().contains("'#' cannot stand here"));
    assertTrue(fault("[".repeat(100)).message().contains("more than 64 deep"));
    assertTrue(fault("[" + "1".repeat(200) + "]").message().contains("more than 100 digits"));
    assertTrue(fault("{\"" + "n".repeat(300) + "\":1}").message().contains("200 characters"));
    assertTrue(fault("[" + "1,".repeat(2_100_000) + "1]").message().contains("2000000 values"));
  }

  @TestFactory
  Stream<DynamicTest> no_sentence_names_what_is_inside() {
    return BrokenPlans.syntax().entrySet().stream()
        .map(
            broken ->
                DynamicTest.dynamicTest(
                    broken.getKey(),
                    () -> {
                      String sentence = fault(broken.getValue()).sentence();
                      assertFalse(BrokenPlans.namesInnards(sentence), sentence);
                      assertFalse(sentence.contains("This is not JSON."), sentence);
                    }));
  }
}
