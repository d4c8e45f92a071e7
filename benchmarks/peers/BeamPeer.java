import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import uk.ac.ebi.beam.Graph;

/** Parse, hydrogen counts and Kekule form with Beam. usage: BeamPeer parse FILE PASSES */
public final class BeamPeer {
    public static void main(String[] args) throws Exception {
        List<String> lines = Files.readAllLines(Path.of(args[1])).stream()
            .map(line -> line.split("[ \t]")[0]).collect(Collectors.toList());
        double best = Double.MAX_VALUE;
        long check = 0;
        for (int pass = 0; pass < Integer.parseInt(args[2]); pass++) {
            check = 0;
            long start = ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
            for (String line : lines) {
                try {
                    Graph graph = Graph.fromSmiles(line).kekule();
                    for (int atom = 0; atom < graph.order(); atom++) {
                        check += graph.implHCount(atom);
                    }
                } catch (java.io.IOException refused) {
                    check++;
                }
            }
            best = Math.min(best, (ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime() - start) / 1e3 / lines.size());
        }
        System.out.println(best + " " + check);
    }
}
