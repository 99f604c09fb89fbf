package spanwright.web;

import spanwright.plan.Fault;

/** A text that is not JSON, or more deeply nested or longer than is accepted. */
public final class BadJson extends Exception {
  private final transient Fault fault;

  BadJson(Fault fault) {
    super(fault.sentence());
    this.fault = fault;
  }

  /** Where, as line and column, and what. */
  public Fault fault() {
    return fault;
  }
}
