package spanwright.rigging;

import java.util.HashMap;
import java.util.Map;
import spanwright.plan.Catalogue;
import spanwright.plan.Plan;
import spanwright.plan.RuleKind;

/** The rules as a plan has them: defaults of the catalogue, overrides of the brief. */
public final class RuleBook {
  private final Map<String, Double> values = new HashMap<>();

  private RuleBook() {}

  /** The rules of a plan. */
  public static RuleBook of(Plan plan, Catalogue catalogue) {
    RuleBook book = new RuleBook();
    for (RuleKind rule : catalogue.rules()) {
      book.values.put(rule.id(), rule.defaultValue());
    }
    if (plan.brief() != null && plan.brief().rules() != null) {
      for (Map.Entry<String, Double> override : plan.brief().rules().overrides().entrySet()) {
        book.values.computeIfPresent(override.getKey(), (id, value) -> override.getValue());
      }
    }
    return book;
  }

  /**
   * The value of a rule, in its unit.
   *
   * @throws IllegalArgumentException when the catalogue has no such rule
   */
  public double value(String id) {
    Double value = values.get(id);
    if (value == null) {
      throw new IllegalArgumentException(
          "rules: the catalogue has no rule \"" + id + "\". Add it with its default and source.");
    }
    return value;
  }
}
