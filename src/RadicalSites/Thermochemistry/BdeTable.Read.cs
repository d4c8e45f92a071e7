using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

public sealed partial class BdeTable
{
    /// <summary>Number of the shipped tables; raised with every changed value.</summary>
    public const string ShippedNumber = "2026.1";

    private static readonly string[] UserColumns = ["id", "bond", "structure", "kilojoules_per_mole", "sigma", "source", "locator"];

    /// <summary>Reads a table of the user.</summary>
    /// <remarks>
    /// Columns: id, bond, structure, kilojoules_per_mole, sigma, source, locator, and optionally note. The bond is
    /// <c>C-H</c> (structure = SMILES with the carbon in atom class 1), <c>class</c> (structure = degree, optionally
    /// followed by a colon and groups: <c>secondary</c>, <c>primary:Benzylic</c>), or another bond such as <c>H-Br</c>,
    /// <c>Br-Br</c>, or <c>C-Br</c> with a degree as structure. Lines that start with # are comments.
    /// </remarks>
    /// <param name="name">Name for messages, usually the file name.</param>
    /// <param name="text">The table.</param>
    /// <returns>The table on its own; see <see cref="Overlay"/>.</returns>
    /// <exception cref="TableFormatException">A row breaks the schema; the message names line and column.</exception>
    public static BdeTable Parse(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(text);
        CsvTable table = CsvTable.Read(name, text, UserColumns, ["note", "kind"]);
        var entries = new List<BdeEntry>();
        var classes = new List<BdeClassEntry>();
        var bonds = new List<BondEntry>();
        var ids = new HashSet<string>(StringComparer.Ordinal);
        var keys = new HashSet<string>(StringComparer.Ordinal);
        foreach (CsvRow row in table.Rows)
        {
            string id = UniqueId(row, ids);
            double value = row.Number("kilojoules_per_mole", 50, 700);
            double sigma = row.Number("sigma", 0, 100);
            string source = row.Required("source");
            string locator = row.Required("locator");
            string structure = row.Required("structure");
            string bond = row.Required("bond");
            if (!keys.Add(bond + "|" + structure))
            {
                throw row.Error("structure", $"the bond {bond} of {structure} occurs twice; keep one row.");
            }

            if (bond == "C-H")
            {
                BdeKind kind = row.Text("kind").Length == 0 ? BdeKind.Measured : row.Choice<BdeKind>("kind");
                entries.Add(WithMolecule(row, "structure", new BdeEntry(
                    id, structure, structure, value, sigma, kind, source, locator, true, "", row.Text("note"), name)));
            }
            else if (bond == "class")
            {
                string[] parts = structure.Split(':');
                SiteDegree degree = DegreeOf(row, parts[0]);
                string group = parts.Length > 1 ? parts[1] : "";
                classes.Add(new BdeClassEntry(
                    id, group.Length == 0 ? "base" : "group", group, degree, value, sigma, source, locator, false));
            }
            else if (bond.Contains('-', StringComparison.Ordinal))
            {
                string part = bond.StartsWith("C-", StringComparison.Ordinal)
                    ? CarbonPrefix(DegreeOf(row, structure)) + bond[1..]
                    : bond;
                bonds.Add(new BondEntry(id, part, structure, value, sigma, source, locator));
            }
            else
            {
                throw row.Error("bond", $"'{bond}' is none of C-H, class, or two parts joined by a hyphen such as H-Br.");
            }
        }

        return new BdeTable(name, ChecksumOf(text), entries, classes, bonds);
    }

    internal static string CarbonPrefix(SiteDegree degree) => degree switch
    {
        SiteDegree.Methyl => "CH3",
        SiteDegree.Primary => "C2H5",
        SiteDegree.Secondary => "iPr",
        _ => "tBu",
    };

    private static SiteDegree DegreeOf(CsvRow row, string text) =>
        Enum.TryParse(text, ignoreCase: true, out SiteDegree degree) && !char.IsAsciiDigit(text[0])
            ? degree
            : throw row.Error("structure", $"'{text}' is none of methyl, primary, secondary, tertiary.");

    private static BdeTable ReadShipped()
    {
        CsvTable bonds = CsvTable.ReadEmbedded(
            "bonds.csv", "id", "bond", "substance", "kilojoules_per_mole", "sigma", "source", "locator");
        CsvTable classes = CsvTable.ReadEmbedded(
            "bde_classes.csv", "id", "kind", "group", "degree", "kilojoules_per_mole", "sigma", "source", "locator", "role");
        CsvTable hydrogens = CsvTable.ReadEmbedded(
            "bde.csv", "id", "substance", "smiles", "kilojoules_per_mole", "sigma", "kind", "source", "locator",
            "preferred", "checked", "note");
        var ids = new HashSet<string>(StringComparer.Ordinal);
        BdeEntry[] entries =
        [
            .. hydrogens.Rows.Select(row => WithMolecule(row, "smiles", new BdeEntry(
                UniqueId(row, ids), row.Required("substance"), row.Required("smiles"),
                row.Number("kilojoules_per_mole", 250, 600), row.Number("sigma", 0, 30), row.Choice<BdeKind>("kind"),
                row.Required("source"), row.Required("locator"), row.Required("preferred") == "yes", row.Text("checked"),
                row.Text("note"), "shipped"))),
        ];
        BdeClassEntry[] classEntries =
        [
            .. classes.Rows.Select(row => new BdeClassEntry(
                UniqueId(row, ids), row.Required("kind"), row.Text("group"), row.Choice<SiteDegree>("degree"),
                row.Number("kilojoules_per_mole", -100, 600), row.Number("sigma", 0, 30), row.Required("source"),
                row.Required("locator"), row.Required("role") == "analogy")),
        ];
        BondEntry[] bondEntries =
        [
            .. bonds.Rows.Select(row => new BondEntry(
                UniqueId(row, ids), row.Required("bond"), row.Required("substance"),
                row.Number("kilojoules_per_mole", 50, 700), row.Number("sigma", 0, 30), row.Required("source"),
                row.Required("locator"))),
        ];
        return new BdeTable(
            "shipped", ShippedNumber + "-" + ChecksumOf(hydrogens.Text, classes.Text, bonds.Text), entries, classEntries,
            bondEntries);
    }

    private static string UniqueId(CsvRow row, HashSet<string> ids)
    {
        string id = row.Required("id");
        return ids.Add(id) ? id : throw row.Error("id", $"the id {id} occurs twice.");
    }

    private static BdeEntry WithMolecule(CsvRow row, string column, BdeEntry entry)
    {
        if (!SmilesReader.TryParse(entry.Smiles, out Molecule? molecule, out FormatProblem? problem))
        {
            throw row.Error(column, problem.Message);
        }

        int marked = -1;
        for (int i = 0; i < molecule.AtomCount; i++)
        {
            if (molecule.Atoms[i].AtomClass == 1)
            {
                marked = marked < 0 ? i : throw row.Error(column, "two atoms carry the class 1; mark one carbon.");
            }
        }

        if (marked < 0 || molecule.Atoms[marked].AtomicNumber != 6 || molecule.Atoms[marked].HydrogenCount == 0)
        {
            throw row.Error(column, "mark the carbon of the C-H bond with the atom class 1, as in C[CH2:1]C.");
        }

        return entry with { Molecule = molecule, Carbon = marked };
    }
}
