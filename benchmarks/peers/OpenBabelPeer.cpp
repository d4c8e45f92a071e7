// The work of the benchmark done with Open Babel. usage: openbabel_peer MODE FILE PASSES
// Prints the best pass [microseconds of processor time per molecule] and a check number that depends on the results.
#include <openbabel/atom.h>
#include <openbabel/canon.h>
#include <openbabel/graphsym.h>
#include <openbabel/mol.h>
#include <openbabel/obconversion.h>
#include <openbabel/obiter.h>
#include <openbabel/oberror.h>

#include <algorithm>
#include <ctime>
#include <fstream>
#include <iostream>
#include <set>
#include <string>
#include <vector>

using namespace OpenBabel;

int main(int argc, char **argv) {
  if (argc != 4) return 2;
  obErrorLog.StopLogging();
  const std::string mode = argv[1];
  std::ifstream file(argv[2]);
  std::vector<std::string> lines;
  for (std::string line; std::getline(file, line);) {
    lines.push_back(line.substr(0, line.find_first_of(" \t")));
  }
  OBConversion conversion;
  conversion.SetInAndOutFormats("smi", "can");
  conversion.AddOption("n", OBConversion::OUTOPTIONS);
  double best = 1e300;
  size_t check = 0;
  for (int pass = 0; pass < std::stoi(argv[3]); ++pass) {
    check = 0;
    const std::clock_t start = std::clock();
    for (const auto &line : lines) {
      OBMol mol;
      if (!conversion.ReadString(&mol, line)) continue;
      if (mode == "parse") {
        FOR_ATOMS_OF_MOL(atom, mol) check += atom->GetImplicitHCount();
      } else if (mode == "sites") {
        OBGraphSym symmetry(&mol);
        std::vector<unsigned> classes;
        symmetry.GetSymmetry(classes);
        std::set<unsigned> seen;
        FOR_ATOMS_OF_MOL(atom, mol) {
          if (atom->GetAtomicNum() == 6 && atom->GetHyb() == 3 && atom->GetImplicitHCount() > 0) {
            seen.insert(classes[atom->GetIndex()]);
          }
        }
        check += seen.size();
      } else {
        check += conversion.WriteString(&mol, true).size();
      }
    }
    best = std::min(best, 1e6 * (std::clock() - start) / CLOCKS_PER_SEC / lines.size());
  }
  std::cout << best << " " << check << std::endl;
}
