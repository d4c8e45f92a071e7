#!/usr/bin/python3
"""Makes the files of TestData/Reference again, with reference toolkits from Debian.

usage: regenerate.py [nci] [named] [stereo] [strings] [polychlorination]
Without arguments everything is made. Needs root or sudo once, to install the toolkits by package name.
"""
import shutil
import subprocess
import sys
from pathlib import Path

PACKAGES = ["python3-rdkit", "rdkit-data", "openbabel", "libinchi-bin", "libbeam-java", "libopenchemlib-java",
            "default-jdk-headless"]
HERE = Path(__file__).resolve().parent
REFERENCE = HERE.parent / "Reference"
NCI_FILE = Path("/usr/share/RDKit/Data/NCI/first_5K.smi")


def install():
    missing = [name for name in PACKAGES if subprocess.run(
        ["dpkg-query", "-W", "-f", "${Status}", name], capture_output=True, text=True, check=False
    ).stdout != "install ok installed"]
    if missing:
        sudo = ["sudo"] if shutil.which("sudo") else []
        subprocess.run(sudo + ["apt-get", "update", "-qq"], check=True)
        subprocess.run(sudo + ["apt-get", "install", "-y", "-qq"] + missing, check=True)


def versions():
    rows = subprocess.run(["dpkg-query", "-W", "-f", "${Package} ${Version}\n"] + PACKAGES[:-1],
                          capture_output=True, text=True, check=True).stdout.split("\n")
    return ", ".join(row for row in rows if row)


def write(name, comments, columns, rows):
    """Writes one tab-separated table: comment lines, a line of column names, rows."""
    REFERENCE.mkdir(exist_ok=True)
    lines = [f"# {line}" for line in comments] + [f"# Made with {versions()}.", "\t".join(columns)]
    lines += ["\t".join(str(field) for field in row) for row in rows]
    (REFERENCE / name).write_text("\n".join(lines) + "\n", encoding="utf-8")
    print(f"{name}: {len(rows)} rows")


def main():
    install()
    sys.path.insert(0, str(HERE))
    import importlib
    wanted = sys.argv[1:] or ["nci", "named", "stereo", "strings", "polychlorination"]
    for name in wanted:
        importlib.import_module("make_" + name).make(write)


if __name__ == "__main__":
    sys.modules["regenerate"] = sys.modules["__main__"]
    main()
