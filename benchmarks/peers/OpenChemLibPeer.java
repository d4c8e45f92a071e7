import com.actelion.research.chem.Canonizer;
import com.actelion.research.chem.IsomericSmilesCreator;
import com.actelion.research.chem.SmilesParser;
import com.actelion.research.chem.StereoMolecule;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Parse, symmetry classes and canonical SMILES with OpenChemLib. usage: OpenChemLibPeer MODE FILE PASSES */
public final class OpenChemLibPeer {
    public static void main(String[] args) throws Exception {
        List<String> lines = Files.readAllLines(Path.of(args[1])).stream()
            .map(line -> line.split("[ \t]")[0]).collect(Collectors.toList());
        double best = Double.MAX_VALUE;
        long check = 0;
        for (int pass = 0; pass < Integer.parseInt(args[2]); pass++) {
            check = 0;
            long start = ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
            for (String line : lines) {
                StereoMolecule molecule = new StereoMolecule();
                try {
                    new SmilesParser().parse(molecule, line.getBytes(), false, true);
                    check += work(args[0], molecule);
                } catch (Exception refused) {
                    check++;
                }
            }
            best = Math.min(best, (ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime() - start) / 1e3 / lines.size());
        }
        System.out.println(best + " " + check);
    }

    private static long work(String mode, StereoMolecule molecule) {
        long result = 0;
        if (mode.equals("parse")) {
            molecule.ensureHelperArrays(StereoMolecule.cHelperNeighbours);
            for (int atom = 0; atom < molecule.getAtoms(); atom++) {
                result += molecule.getImplicitHydrogens(atom);
            }
        } else if (mode.equals("sites")) {
            Canonizer canonizer = new Canonizer(molecule, Canonizer.CREATE_SYMMETRY_RANK);
            Set<Integer> seen = new HashSet<>();
            for (int atom = 0; atom < molecule.getAtoms(); atom++) {
                if (molecule.getAtomicNo(atom) == 6 && molecule.getAllHydrogens(atom) > 0
                    && molecule.getAtomPi(atom) == 0 && !molecule.isAromaticAtom(atom)) {
                    seen.add(canonizer.getSymmetryRank(atom));
                }
            }
            result = seen.size();
        } else {
            result = IsomericSmilesCreator.createSmiles(molecule).length();
        }
        return result;
    }
}
