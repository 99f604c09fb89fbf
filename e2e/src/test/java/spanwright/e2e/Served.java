package spanwright.e2e;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.RequestOptions;

/** What the server says when it is asked beside the page. */
final class Served {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  private Served() {}

  static JsonNode json(String text) {
    try {
      return MAPPER.readTree(text);
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException("not JSON: " + text, e);
    }
  }

  static JsonNode get(Page page, Program program, String path) {
    APIResponse response = page.request().get(program.address() + path);
    if (!response.ok()) {
      throw new IllegalStateException(path + " answered " + response.status());
    }
    return json(response.text());
  }

  static JsonNode newestPlan(Page page, Program program) {
    String id = get(page, program, "/api/plans").at("/0/id").asText();
    return get(page, program, "/api/plans/" + id);
  }

  static JsonNode check(Page page, Program program, JsonNode plan) {
    APIResponse response =
        page.request()
            .post(
                program.address() + "/api/check",
                RequestOptions.create()
                    .setHeader("Content-Type", "application/json")
                    .setData(plan.toString()));
    return json(response.text());
  }
}
