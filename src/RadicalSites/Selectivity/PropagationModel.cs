using System;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Selectivity;

/// <summary>Enthalpies of both propagation steps at a site by Hess's law.</summary>
/// <remarks>
/// The C-X bond of a site is that of its class shifted by as much as its C-H bond is shifted from the class: the radical
/// is common to both bonds.
/// </remarks>
internal sealed class PropagationModel
{
    private const double RefusedAbstraction = 80;
    private const double SlowAbstraction = 20;

    // Extra uncertainty where the C-X bond of another class has to serve [kJ/mol].
    private const double BorrowedSigma = 8;

    private readonly BdeTable table;
    private readonly BondEntry? hydrogenBond;
    private readonly BondEntry? transferBond;
    private readonly (double Value, double Sigma, double Anchor)?[] carbonHalogen = new (double, double, double)?[6];

    internal PropagationModel(Reagent reagent, BdeTable table)
    {
        this.table = table;
        hydrogenBond = table.FindBond(reagent.HydrogenBond);
        transferBond = table.FindBond(reagent.TransferBond);
        string symbol = Elements.SymbolOf(reagent.Halogen);
        carbonHalogen[0] = Find("CH3-" + symbol, Base(SiteDegree.Methyl));
        carbonHalogen[1] = Find("C2H5-" + symbol, Base(SiteDegree.Primary)) ?? Borrow(0);
        carbonHalogen[2] = Find("iPr-" + symbol, Base(SiteDegree.Secondary)) ?? Borrow(1);
        carbonHalogen[3] = Find("tBu-" + symbol, Base(SiteDegree.Tertiary)) ?? Borrow(2);
        carbonHalogen[4] = Find("C6H5CH2-" + symbol, table.FindClass("group", "Benzylic", SiteDegree.Primary)?.KilojoulesPerMole);
        carbonHalogen[5] = Find("allyl-" + symbol, table.FindClass("group", "Allylic", SiteDegree.Primary)?.KilojoulesPerMole) ?? Borrow(4);
    }

    internal StepEnthalpies Steps(Site site, BdeAssignment bde)
    {
        if (bde.KilojoulesPerMole is not { } value || bde.SigmaKilojoulesPerMole is not { } sigma)
        {
            return new StepEnthalpies(null, null, null, ChainVerdict.Unknown);
        }

        double? abstraction = value - hydrogenBond?.KilojoulesPerMole;
        (double Value, double Sigma, double Anchor)? carbon = carbonHalogen[RowOf(site)];
        double? transfer = null;
        double transferSigma = 0;
        if (carbon is { } row && transferBond is not null)
        {
            transfer = transferBond.KilojoulesPerMole - (row.Value + value - row.Anchor);
            transferSigma = Math.Sqrt((row.Sigma * row.Sigma) + (sigma * sigma) + (transferBond.SigmaKilojoulesPerMole * transferBond.SigmaKilojoulesPerMole));
        }

        return new StepEnthalpies(
            Round(abstraction), Round(transfer), Round(Math.Max(sigma, transferSigma)), Judge(abstraction, transfer));
    }

    private static double? Round(double? value) => value is { } number ? Math.Round(number, 3) : null;

    private static ChainVerdict Judge(double? abstraction, double? transfer) => abstraction switch
    {
        null => ChainVerdict.Unknown,
        > RefusedAbstraction => ChainVerdict.Refused,
        _ when abstraction + transfer > 0 => ChainVerdict.Refused,
        > SlowAbstraction => ChainVerdict.Slow,
        _ => transfer is null ? ChainVerdict.Unknown : ChainVerdict.Propagates,
    };

    private static int RowOf(Site site)
    {
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            return neighbor.Kind is ConjugationKind.Benzylic or ConjugationKind.HeteroBenzylic ? 4 : 5;
        }

        return (int)site.Degree;
    }

    private double? Base(SiteDegree degree) => table.FindClass("base", "", degree)?.KilojoulesPerMole;

    private (double Value, double Sigma, double Anchor)? Find(string bond, double? anchor) =>
        table.FindBond(bond) is { } entry && anchor is { } value
            ? (entry.KilojoulesPerMole, entry.SigmaKilojoulesPerMole, value)
            : null;

    private (double Value, double Sigma, double Anchor)? Borrow(int row) =>
        carbonHalogen[row] is { } other ? (other.Value, other.Sigma + BorrowedSigma, other.Anchor) : null;
}
