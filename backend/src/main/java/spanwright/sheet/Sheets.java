package spanwright.sheet;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.plan.Catalogue;
import spanwright.plan.Json;
import spanwright.plan.Plan;

/** Makes sheets and writes them: the front door of the package. */
public final class Sheets {
  private Sheets() {}

  /**
   * Works a sheet out.
   *
   * @param plan the survey and the brief, complete
   * @param catalogue what the placement's ids refer to
   * @param placement as assessed on that plan
   * @param options paper, units, times
   * @throws IllegalArgumentException with a sentence for people when the placement does not belong
   *     to the plan
   */
  public static SheetModel of(
      Plan plan, Catalogue catalogue, Placement placement, SheetOptions options) {
    return of(plan, catalogue, placement, options, List.of(), List.of());
  }

  /**
   * Works a sheet out, as the revision it is.
   *
   * @param plan the survey and the brief, complete
   * @param catalogue what the placement's ids refer to
   * @param placement as assessed on that plan
   * @param options paper, units, times
   * @param others placements of the same search, to say what consents buy; may be empty
   * @param issued sheets issued before of this plot, in order; may be empty
   * @throws IllegalArgumentException with a sentence for people when the placement does not belong
   *     to the plan
   */
  public static SheetModel of(
      Plan plan,
      Catalogue catalogue,
      Placement placement,
      SheetOptions options,
      List<Placement> others,
      List<Issued> issued) {
    return Revisions.revise(SheetMaker.make(plan, catalogue, placement, options, others), issued);
  }

  /** What to keep of a sheet when it is handed out on a day. */
  public static Issued issue(SheetModel model, String date) {
    return new Issued(model.head().revision(), date, model.head().placement(), Facts.of(model));
  }

  /** The whole sheet as PDF: list, then drawing. */
  public static byte[] toPdf(SheetModel model) {
    return PdfWriter.write(model.head().title() + ", " + model.head().name(), PageMaker.all(model));
  }

  /** The list as CSV (RFC 4180), one section after another, UTF-8. */
  public static String toCsv(SheetModel model) {
    return CsvWriter.write(model);
  }

  /** The model as JSON. */
  public static String toJson(SheetModel model) {
    try {
      return Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(model) + "\n";
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the sheet could not be written as JSON", e);
    }
  }

  /**
   * The site drawing, plan over side views, as SVG, true to scale in millimetres, standing alone.
   */
  public static String toSvg(SheetModel model) {
    return SvgWriter.write(
        "Site drawing of " + model.head().title() + ", " + model.head().name(),
        Revisions.sentences(model.head()),
        PageMaker.drawing(model));
  }

  /**
   * The site as GeoJSON (RFC 7946), WGS 84.
   *
   * @throws NoCoordinatesException when the plan has no latitude and longitude
   */
  public static String toGeoJson(SheetModel model) {
    return GeoJsonWriter.write(model);
  }
}
