import java.nio.file.Files;
import java.nio.file.Path;
import uk.ac.ebi.beam.Atom;
import uk.ac.ebi.beam.Graph;

/** Charge and hydrogens on each atom as Beam states them. usage: BeamFacts FILE */
public final class BeamFacts {
    public static void main(String[] args) throws Exception {
        for (String line : Files.readAllLines(Path.of(args[0]))) {
            System.out.println(facts(line));
        }
    }

    private static String facts(String smiles) {
        try {
            Graph graph = Graph.fromSmiles(smiles).kekule();
            int charge = 0;
            StringBuilder hydrogens = new StringBuilder();
            for (int i = 0; i < graph.order(); i++) {
                Atom atom = graph.atom(i);
                charge += atom.charge();
                hydrogens.append(i > 0 ? " " : "").append(graph.implHCount(i));
            }
            return charge + "\t" + hydrogens;
        } catch (Exception refused) {
            return "error\t";
        }
    }
}
