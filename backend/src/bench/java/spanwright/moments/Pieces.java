package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/** What {@link PreparedModel} holds inside, for benchmarks of the parts. */
record Pieces(AntennaModel model, Mesh mesh, StaticPairs statics, SourcePoints points) {
  static Pieces of(AntennaModel model, double frequencyMHz) {
    double k = Constants.waveNumber(frequencyMHz);
    Outline outline = Outline.of(model, 0.008);
    Mesh mesh = Mesh.of(model, outline, MeshRule.of(MeshAim.FULL), k);
    return new Pieces(model, mesh, new StaticPairs(mesh), new SourcePoints(mesh));
  }

  SymmetricSystem fill(Reflection reflection, double frequencyMHz) {
    double k = Constants.waveNumber(frequencyMHz);
    MatrixFill fill = new MatrixFill(mesh, statics, points, reflection, k);
    SymmetricSystem system = fill.fields();
    int wires = model.wires().size();
    Complex[] internal = new Complex[wires];
    double[] elastance = new double[wires];
    for (int w = 0; w < wires; w++) {
      internal[w] = Material.internalImpedance(model.wires().get(w), frequencyMHz);
      elastance[w] = Material.sheathElastance(model.wires().get(w));
    }
    fill.addMaterial(internal, elastance);
    return system;
  }
}
