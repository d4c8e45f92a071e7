using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Molfile;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <summary>State of one pass over a molfile; used again by its thread for the next text.</summary>
internal sealed partial class MolfileParse
{
    private const int MostHydrogenTrials = 16;

    private readonly StructureDraft draft = new();
    private RawAtom[] raw = new RawAtom[64];
    private Point[] points = new Point[64];
    private byte[] marks = new byte[72];
    private List<Diagnostic>? remarks;
    private FormatProblem? failure;
    private bool chiralFlag;
    private bool chargesReset;
    private bool isotopesReset;
    private int forcedHydrogen;

    internal MolfileDocument? Read(ReadOnlySpan<char> text, out FormatProblem? problem)
    {
        MolfileDocument? document = ReadOnce(text, -1, out problem);
        if (document is null && problem?.Descriptor == ProblemCatalogue.Chemistry.NoKekuleForm)
        {
            document = ReadWithHydrogen(text, ref problem);
        }

        return document;
    }

    // Bond type 4 leaves open which nitrogen of a pyrrole-type ring has the hydrogen; a single possibility is taken.
    private MolfileDocument? ReadWithHydrogen(ReadOnlySpan<char> text, ref FormatProblem? problem)
    {
        if (candidates.Count is 0 or > MostHydrogenTrials)
        {
            return null;
        }

        MolfileDocument? found = null;
        List<int> working = [];
        foreach (int atom in candidates)
        {
            if (ReadOnce(text, atom, out _) is { } document)
            {
                found = document;
                working.Add(atom + 1);
            }
        }

        if (working.Count == 1)
        {
            return found! with
            {
                Remarks = [.. found.Remarks, Diagnostic.Create(Remark.HydrogenPlaced, [], working[0])],
            };
        }

        if (working.Count > 1)
        {
            problem = new FormatProblem
            {
                Descriptor = Entry.AromaticHydrogen,
                Message = Entry.AromaticHydrogen.Format(string.Join(", ", working)),
                Line = raw[working[0] - 1].Line,
                Atoms = working.ConvertAll(static number => number - 1),
            };
        }

        return null;
    }

    private MolfileDocument? ReadOnce(ReadOnlySpan<char> text, int hydrogenOn, out FormatProblem? problem)
    {
        draft.Clear();
        remarks = null;
        failure = null;
        chiralFlag = false;
        chargesReset = false;
        isotopesReset = false;
        forcedHydrogen = hydrogenOn;
        problem = null;

        var cursor = new LineCursor(text.Length > 0 && text[0] == '\uFEFF' ? text[1..] : text);
        cursor.Next();
        ReadOnlySpan<char> name = cursor.Current;
        if (name.StartsWith("$RXN", StringComparison.Ordinal) || name.StartsWith("$RDFILE", StringComparison.Ordinal)
            || name.StartsWith("$MDL", StringComparison.Ordinal))
        {
            Fail(Entry.Reaction, ref cursor, 0, name.Trim().ToString());
            problem = failure;
            return null;
        }

        cursor.Next();
        ReadOnlySpan<char> program = cursor.Current;
        cursor.Next();
        ReadOnlySpan<char> comment = cursor.Current;
        bool ok = cursor.Next() ? Counts(ref cursor, out MolfileVersion version) : Fail(Entry.Empty, ref cursor, -1, out version);
        int endLine = cursor.Line;
        ok = ok && Connect(ref cursor);
        if (!ok)
        {
            problem = failure;
            return null;
        }

        CompleteHydrogens(out ok);
        if (!ok)
        {
            problem = failure;
            return null;
        }

        if (draft.HasAromatic && hydrogenOn < 0)
        {
            FindHydrogenCandidates();
        }

        AddCoordinatesAndStereo(FieldText.Columns(program, 20, 2).SequenceEqual("2D"));
        Molecule? molecule = MoleculeCompletion.Complete(draft, out problem);
        if (molecule is null)
        {
            problem = problem! with { Line = problem.Position, Position = -1 };
            return null;
        }

        return new MolfileDocument
        {
            Name = name.Trim().ToString(),
            ProgramLine = program.ToString(),
            Comment = comment.ToString(),
            Version = version,
            IsChiralFlagSet = chiralFlag,
            Molecule = WithoutAromaticMarks(molecule),
            Remarks = remarks is null ? Array.Empty<Diagnostic>() : remarks.ToArray(),
            EndLine = endLine,
        };
    }

    private bool Counts(ref LineCursor cursor, out MolfileVersion version)
    {
        ReadOnlySpan<char> line = cursor.Current;
        version = MolfileVersion.V2000;
        ReadOnlySpan<char> tag = FieldText.Columns(line, 33, 6).Trim(' ');
        if (tag.IsEmpty && line.TrimEnd().EndsWith("V3000", StringComparison.Ordinal))
        {
            tag = "V3000";
        }

        if (tag.SequenceEqual("V3000"))
        {
            version = MolfileVersion.V3000;
            return Extended(ref cursor);
        }

        if (line.IsWhiteSpace())
        {
            return Fail(Entry.CountsLine, ref cursor, 0, "it is blank");
        }

        if (!FieldText.TryInteger(FieldText.Columns(line, 0, 3), out int atoms)
            || !FieldText.TryInteger(FieldText.Columns(line, 3, 3), out int bonds) || atoms < 0 || bonds < 0 || line.Length < 6)
        {
            ReadOnlySpan<char> rest = line;
            if (!FieldText.TryInteger(FieldText.Word(ref rest), out atoms) || !FieldText.TryInteger(FieldText.Word(ref rest), out bonds)
                || atoms is < 0 or > 999 || bonds is < 0 or > 999 || !line.Contains("V2000", StringComparison.Ordinal))
            {
                return Fail(Entry.CountsLine, ref cursor, 0, "it does not start with the numbers of atoms and bonds");
            }

            Note(Remark.Misaligned, cursor.Line);
            return Blocks(ref cursor, atoms, bonds, 0);
        }

        if (!tag.IsEmpty && !tag.SequenceEqual("V2000") && tag[0] is 'V' or 'v')
        {
            return Fail(Entry.Version, ref cursor, 33, tag.ToString());
        }

        if (!FieldText.TryInteger(FieldText.Columns(line, 6, 3), out int lists) || lists > 0)
        {
            return lists > 0
                ? Fail(Entry.QueryAtom, ref cursor, 6, "atom list")
                : Fail(Entry.Field, ref cursor, 6, FieldText.Columns(line, 6, 3).ToString(), "number of atom lists");
        }

        chiralFlag = FieldText.TryInteger(FieldText.Columns(line, 12, 3), out int flag) && flag == 1;
        return FieldText.TryInteger(FieldText.Columns(line, 15, 3), out int texts) && texts is >= 0 and < 1000
            ? Blocks(ref cursor, atoms, bonds, texts)
            : Fail(Entry.Field, ref cursor, 15, FieldText.Columns(line, 15, 3).ToString(), "number of text entries");
    }

    private ref BuilderAtom AddAtom(int line)
    {
        int index = draft.AtomCount;
        if (index == raw.Length)
        {
            Array.Resize(ref raw, 2 * index);
            Array.Resize(ref points, 2 * index);
        }

        raw[index] = new RawAtom { Valence = -1, Line = line };
        ref BuilderAtom atom = ref draft.AddAtom();
        atom.Position = line;
        return ref atom;
    }

    private void AddBond(int begin, int end, int type, byte mark, int line)
    {
        if (draft.BondCount == marks.Length)
        {
            Array.Resize(ref marks, 2 * draft.BondCount);
        }

        marks[draft.BondCount] = mark;
        ref BuilderBond bond = ref draft.AddBond();
        bond.Begin = begin;
        bond.End = end;
        bond.Position = line;
        if (type == 4)
        {
            bond.IsAromatic = true;
            draft.HasAromatic = true;
            draft.Atoms[begin].IsAromatic = true;
            draft.Atoms[end].IsAromatic = true;
        }
        else
        {
            bond.Order = (BondOrder)type;
        }
    }

    private void Note(ProblemDescriptor entry, params object[] arguments) =>
        (remarks ??= []).Add(Diagnostic.Create(entry, [], arguments));

    private bool Fail(ProblemDescriptor entry, ref LineCursor cursor, int column, params object[] arguments) =>
        Fail(entry, cursor.Line, cursor.Current, column, arguments);

    private bool Fail(ProblemDescriptor entry, ref LineCursor cursor, int column, out MolfileVersion version)
    {
        version = MolfileVersion.V2000;
        return Fail(entry, ref cursor, column);
    }

    private bool Fail(ProblemDescriptor entry, int line, ReadOnlySpan<char> text, int column, object[] arguments)
    {
        failure = new FormatProblem
        {
            Descriptor = entry,
            Message = entry.Format(arguments),
            Line = line,
            Position = text.IsEmpty ? -1 : column,
            Input = (text.Length > 256 ? text[..256] : text).ToString(),
        };
        return false;
    }

    /// <summary>What the atom block says beyond the fields of the builder.</summary>
    private struct RawAtom
    {
        /// <summary>Total valence as stated; -1 = not stated.</summary>
        internal sbyte Valence;

        /// <summary>Radical code: 0 none, 1 singlet, 2 doublet, 3 triplet.</summary>
        internal byte Radical;

        /// <summary>Atom parity: 0 none, 1 odd, 2 even, 3 either.</summary>
        internal byte Parity;

        /// <summary>Whether the symbol D or T names the isotope, which M  ISO does not take back.</summary>
        internal bool NamedIsotope;

        /// <summary>1-based line.</summary>
        internal int Line;
    }
}
