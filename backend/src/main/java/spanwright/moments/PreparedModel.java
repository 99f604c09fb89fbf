package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/**
 * One model meshed for frequencies up to some highest: everything that does not depend on the
 * frequency, worked out once.
 */
final class PreparedModel {
  private final AntennaModel model;
  private final Ground ground;
  private final Mesh mesh;
  private final StaticPairs statics;
  private final SourcePoints points;
  private final Sightlines sightlines;
  private final RatioRows ratioRows;
  private final Doubts doubts;

  PreparedModel(AntennaModel model, Ground ground, double highestMHz, MeshRule rule) {
    this(model, ground, highestMHz, rule, false);
  }

  /**
   * @param several whether it will be solved at more than one frequency
   */
  PreparedModel(
      AntennaModel model, Ground ground, double highestMHz, MeshRule rule, boolean several) {
    this.model = model;
    this.ground = ground;
    double k = Constants.waveNumber(highestMHz);
    Outline outline = Outline.of(model, rule.tolerance(model, ground, k));
    mesh = Mesh.of(model, outline, rule, k);
    statics = new StaticPairs(mesh);
    points = new SourcePoints(mesh);
    boolean grounded = ground.kind() != Ground.Kind.NONE;
    sightlines = new Sightlines(mesh, points, statics, grounded, several);
    ratioRows = grounded ? new RatioRows(mesh, points) : null;
    doubts = Doubts.about(model, ground, outline, mesh, statics);
  }

  Solution solve(double frequencyMHz, Reflection reflection) {
    double k = Constants.waveNumber(frequencyMHz);
    FillWork work = FillWork.mine();
    SymmetricSystem system = work.system(mesh.unknowns);
    MatrixFill fill =
        new MatrixFill(mesh, statics, points, sightlines, ratioRows, reflection, k, system, work);
    fill.fields();
    int wires = model.wires().size();
    Complex[] internal = new Complex[wires];
    double[] resistance = new double[wires];
    double[] elastance = new double[wires];
    for (int w = 0; w < wires; w++) {
      internal[w] = Material.internalImpedance(model.wires().get(w), frequencyMHz);
      resistance[w] = internal[w].getReal();
      elastance[w] = Material.sheathElastance(model.wires().get(w));
    }
    fill.addMaterial(internal, elastance);
    system.solve(mesh.excitation);
    double ir = 0;
    double ii = 0;
    for (int i = 0; i < mesh.unknowns; i++) {
      ir += mesh.excitation[i] * system.answerRe[i];
      ii += mesh.excitation[i] * system.answerIm[i];
    }
    Complex impedance = new Complex(ir, ii).reciprocal();
    if (impedance.isNaN() || impedance.isInfinite() || !(ir > 0)) {
      throw new ModelFault(
          "At "
              + frequencyMHz
              + " MHz the wires take no power that can be told from rounding: "
              + ModelCheck.name(model.feedWire())
              + " is too short for this frequency, or nearly closed on itself. Lengthen it or"
              + " raise the frequency.");
    }
    Currents currents = new Currents(mesh, system.answerRe, system.answerIm);
    FarField far = new FarField(currents, points, ground, k);
    Doubts all = doubts.copy();
    all.ofFeed(model, frequencyMHz);
    all.ofAnswer(impedance, system, ground);
    Solution.Found found =
        new Solution.Found(
            frequencyMHz, impedance, 0.5 * ir, currents.loss(resistance), system.residual, all);
    return new Solution(found, currents, far, reflection, ground, model.wires(), Double.NaN);
  }
}
