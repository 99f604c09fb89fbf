package spanwright.plan;

/** Every sentence that reading a plan can say, in one place; each is pinned by a test. */
enum Wording {
  NOT_A_PLAN("This is not a plan: %s");

  private final String form;

  Wording(String form) {
    this.form = form;
  }

  String with(Object... parts) {
    return String.format(java.util.Locale.ROOT, form, parts);
  }
}
