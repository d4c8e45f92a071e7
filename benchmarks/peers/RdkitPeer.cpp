// The work of the benchmark done with RDKit. usage: rdkit_peer MODE FILE PASSES
// Prints the best pass [microseconds of processor time per molecule] and a check number that depends on the results.
#include <GraphMol/GraphMol.h>
#include <GraphMol/MolOps.h>
#include <GraphMol/SmilesParse/SmilesParse.h>
#include <GraphMol/SmilesParse/SmilesWrite.h>
#include <GraphMol/new_canon.h>
#include <RDGeneral/RDLog.h>

#include <algorithm>
#include <ctime>
#include <fstream>
#include <iostream>
#include <memory>
#include <set>
#include <string>
#include <vector>

using namespace RDKit;

static std::unique_ptr<RWMol> parse(const std::string &smiles) {
  try {
    return std::unique_ptr<RWMol>(SmilesToMol(smiles));
  } catch (...) {
    return nullptr;
  }
}

static bool isSiteCarbon(const ROMol &mol, const Atom *atom) {
  if (atom->getAtomicNum() != 6 || atom->getIsAromatic() || atom->getTotalNumHs() == 0 ||
      atom->getNumRadicalElectrons() != 0) {
    return false;
  }
  for (const auto &bond : mol.atomBonds(atom)) {
    if (bond->getBondType() != Bond::SINGLE) return false;
  }
  return true;
}

// Lowest atom of each class of C(sp3)-H carbons.
static std::vector<unsigned> sites(const ROMol &mol) {
  std::vector<unsigned> ranks, representatives;
  Canon::rankMolAtoms(mol, ranks, false);
  std::set<unsigned> seen;
  for (const auto atom : mol.atoms()) {
    if (isSiteCarbon(mol, atom) && seen.insert(ranks[atom->getIdx()]).second) {
      representatives.push_back(atom->getIdx());
    }
  }
  return representatives;
}

static size_t predict(const ROMol &mol) {
  std::set<std::string> products;
  for (unsigned carbon : sites(mol)) {
    RWMol product(mol);
    unsigned halogen = product.addAtom(new Atom(17), false, true);
    product.addBond(carbon, halogen, Bond::SINGLE);
    Atom *atom = product.getAtomWithIdx(carbon);
    if (atom->getNumExplicitHs() > 0) atom->setNumExplicitHs(atom->getNumExplicitHs() - 1);
    try {
      MolOps::sanitizeMol(product);
      MolOps::assignStereochemistry(product, true, true);
      products.insert(MolToSmiles(product));
    } catch (...) {
    }
  }
  return products.size();
}

int main(int argc, char **argv) {
  if (argc != 4) return 2;
  boost::logging::disable_logs("rdApp.*");
  const std::string mode = argv[1];
  std::ifstream file(argv[2]);
  std::vector<std::string> lines;
  for (std::string line; std::getline(file, line);) {
    lines.push_back(line.substr(0, line.find_first_of(" \t")));
  }
  std::vector<std::unique_ptr<RWMol>> read;
  if (mode == "write") {
    for (const auto &line : lines) {
      if (auto mol = parse(line)) read.push_back(std::move(mol));
    }
  }
  double best = 1e300;
  size_t check = 0;
  for (int pass = 0; pass < std::stoi(argv[3]); ++pass) {
    check = 0;
    const std::clock_t start = std::clock();
    if (mode == "write") {
      for (const auto &mol : read) check += MolToSmiles(*mol).size();
    } else {
      for (const auto &line : lines) {
        const auto mol = parse(line);
        if (!mol) continue;
        if (mode == "parse") {
          for (const auto atom : mol->atoms()) check += atom->getTotalNumHs();
        } else if (mode == "sites") {
          check += sites(*mol).size();
        } else if (mode == "canonical") {
          check += MolToSmiles(*mol).size();
        } else {
          check += predict(*mol);
        }
      }
    }
    best = std::min(best, 1e6 * (std::clock() - start) / CLOCKS_PER_SEC / lines.size());
  }
  std::cout << best << " " << check << std::endl;
}
