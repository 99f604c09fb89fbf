package spanwright.search;

import java.util.Locale;
import spanwright.plan.Shape;

/** The word for a shape in plan and result files. */
final class ShapeWord {
  private ShapeWord() {}

  static String of(Shape shape) {
    return shape.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
