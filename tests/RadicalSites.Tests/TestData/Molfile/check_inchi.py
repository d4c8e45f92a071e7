#!/usr/bin/env python3
"""InChI of the molfiles this project writes against the InChI of the input, over the NCI file.

    radicalsites convert TestData/Reference/nci_first_5k.smi --format sdf --output nci.sdf
    check_inchi.py nci.sdf TestData/Reference/nci_inchi.tsv

Needs the Debian package libinchi-bin (command inchi_main). Exit code 1 when a molecule differs.
"""
import subprocess
import sys
import tempfile


def main(sdf, table):
    expected = {}
    with open(table, encoding="utf-8") as lines:
        for line in lines:
            if line[0].isdigit():
                number, inchi = line.rstrip("\n").split("\t")[:2]
                expected[number] = inchi
    with tempfile.TemporaryDirectory() as folder:
        out = folder + "/out.txt"
        subprocess.run(["inchi_main", sdf, out, folder + "/log.txt", folder + "/problems.txt", "-NoLabels"], capture_output=True)
        with open(out, encoding="utf-8", errors="replace") as lines:
            inchis = [line.strip() for line in lines if line.startswith("InChI=")]
    with open(sdf, encoding="utf-8") as text:
        numbers = [record.split("\n")[0].strip() for record in text.read().split("$$$$\n")[:-1]]
    if len(numbers) != len(inchis):
        sys.exit(f"{len(numbers)} records but {len(inchis)} InChI")
    different = [number for number, inchi in zip(numbers, inchis) if expected[number] != inchi]
    print(f"{len(numbers)} compared, {len(different)} differ {different[:20]}")
    return 1 if different else 0


sys.exit(main(*sys.argv[1:3]))
