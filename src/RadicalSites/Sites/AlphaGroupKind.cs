namespace RadicalSites.Sites;

/// <summary>Functional group attached directly to the carbon that carries the hydrogen.</summary>
public enum AlphaGroupKind : byte
{
    /// <summary>Hydroxyl oxygen.</summary>
    Hydroxyl,

    /// <summary>Ether (or acetal) oxygen.</summary>
    Ether,

    /// <summary>Single-bonded oxygen of an ester, acid derivative, carbonate or carbamate.</summary>
    EsterOxygen,

    /// <summary>Oxygen of a hydroperoxide or peroxide.</summary>
    PeroxideOxygen,

    /// <summary>Any other oxygen (nitrate, sulfate, phosphate, N-oxyl, alkoxide ...).</summary>
    OtherOxygen,

    /// <summary>Neutral amine nitrogen (no acyl, sulfonyl or nitroso group on it).</summary>
    Amine,

    /// <summary>Nitrogen of an amide, imide, lactam, carbamate, urea or sulfonamide.</summary>
    AmideNitrogen,

    /// <summary>Nitrogen with a positive charge and four substituents or hydrogens.</summary>
    Ammonium,

    /// <summary>Aromatic ring nitrogen (N-alkyl of pyrrole, imidazole, pyridinium ...).</summary>
    AromaticNitrogen,

    /// <summary>Nitrogen of a nitro group.</summary>
    Nitro,

    /// <summary>Any other nitrogen (imine, azo, azide, nitroso, isocyanate ...).</summary>
    OtherNitrogen,

    /// <summary>Sulfur of a thiol, sulfide or disulfide.</summary>
    Sulfide,

    /// <summary>Sulfur of a sulfoxide.</summary>
    Sulfoxide,

    /// <summary>Sulfur of a sulfone, sulfonamide, sulfonate or sulfonyl halide.</summary>
    Sulfonyl,

    /// <summary>Any other sulfur, or selenium or tellurium.</summary>
    OtherChalcogen,

    /// <summary>Carbonyl carbon of an aldehyde.</summary>
    Aldehyde,

    /// <summary>Carbonyl carbon of a ketone.</summary>
    Ketone,

    /// <summary>Carbonyl carbon of a carboxylic acid.</summary>
    CarboxylicAcid,

    /// <summary>Carbonyl carbon of a carboxylate anion.</summary>
    Carboxylate,

    /// <summary>Carbonyl carbon of an ester or anhydride.</summary>
    Ester,

    /// <summary>Carbonyl carbon of an amide.</summary>
    Amide,

    /// <summary>Carbonyl carbon of an acyl halide.</summary>
    AcylHalide,

    /// <summary>Carbon of an imine, thiocarbonyl or other C=heteroatom group.</summary>
    OtherUnsaturatedCarbon,

    /// <summary>Nitrile carbon.</summary>
    Nitrile,

    /// <summary>Fluorine.</summary>
    Fluorine,

    /// <summary>Chlorine.</summary>
    Chlorine,

    /// <summary>Bromine.</summary>
    Bromine,

    /// <summary>Iodine.</summary>
    Iodine,

    /// <summary>Carbon that carries three fluorines.</summary>
    Trifluoromethyl,

    /// <summary>Silicon (or germanium, tin, lead).</summary>
    Silicon,

    /// <summary>Phosphorus (or arsenic, antimony).</summary>
    Phosphorus,

    /// <summary>Boron.</summary>
    Boron,

    /// <summary>A metal atom.</summary>
    Metal,

    /// <summary>Any element not named above, or the wildcard.</summary>
    Other,
}
