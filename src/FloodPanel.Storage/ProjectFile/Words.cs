namespace FloodPanel.Storage.ProjectFile;

/// <summary>The fixed words that a field may hold, and what each stands for.</summary>
internal sealed class Words<T>(params (string Word, T Value)[] pairs)
{
    /// <summary>The words, as a message lists them.</summary>
    public string Allowed { get; } = pairs.Length == 1
        ? $"\"{pairs[0].Word}\""
        : string.Join(", ", pairs[..^1].Select(p => $"\"{p.Word}\"")) + $" or \"{pairs[^1].Word}\"";

    public bool TryFind(string word, out T? value)
    {
        foreach (var pair in pairs)
        {
            if (pair.Word == word)
            {
                value = pair.Value;
                return true;
            }
        }

        value = default;
        return false;
    }

    public string Of(T value) => pairs.Single(p => EqualityComparer<T>.Default.Equals(p.Value, value)).Word;
}

/// <summary>The words of the project file for the choices of the project tree.</summary>
internal static class FileWords
{
    public static readonly Words<DesignBasisKind> DesignBasis = new(
        ("allowable-stress", DesignBasisKind.AllowableStress),
        ("us-strength", DesignBasisKind.UsStrength),
        ("eurocode", DesignBasisKind.Eurocode));

    public static readonly Words<FloodZone> FloodZone = new(
        ("inland", Calculation.ProjectTree.FloodZone.Inland),
        ("coastal-a", Calculation.ProjectTree.FloodZone.CoastalA),
        ("coastal-high-hazard", Calculation.ProjectTree.FloodZone.CoastalHighHazard));

    public static readonly Words<WallKind> Wall = new(
        ("reinforced-concrete", WallKind.ReinforcedConcrete),
        ("masonry", WallKind.Masonry),
        ("cavity-masonry", WallKind.CavityMasonry),
        ("timber-frame", WallKind.TimberFrame),
        ("steel-frame", WallKind.SteelFrame));

    public static readonly Words<GuideMounting> Mounting = new(
        ("wet-face", GuideMounting.WetFace),
        ("dry-face", GuideMounting.DryFace),
        ("reveal", GuideMounting.Reveal));

    public static readonly Words<AnchorMethod> AnchorMethod = new(
        ("approval", Calculation.ProjectTree.AnchorMethod.Approval),
        ("aci-318", Calculation.ProjectTree.AnchorMethod.Aci318),
        ("en-1992-4", Calculation.ProjectTree.AnchorMethod.En1992));

    public static readonly Words<AnchorKind> AnchorKind = new(
        ("headed", Calculation.ProjectTree.AnchorKind.Headed),
        ("hooked", Calculation.ProjectTree.AnchorKind.Hooked),
        ("post-installed", Calculation.ProjectTree.AnchorKind.PostInstalled));

    public static readonly Words<WallMeasure> WallMeasure = new(
        ("resistance", Calculation.ProjectTree.WallMeasure.Resistance),
        ("published-depth", Calculation.ProjectTree.WallMeasure.PublishedDepth));

    public static readonly Words<CreepSoil> Soil = new(
        ("very-fine-sand-or-silt", CreepSoil.VeryFineSandOrSilt),
        ("fine-sand", CreepSoil.FineSand),
        ("medium-sand", CreepSoil.MediumSand),
        ("coarse-sand", CreepSoil.CoarseSand),
        ("fine-gravel", CreepSoil.FineGravel),
        ("medium-gravel", CreepSoil.MediumGravel),
        ("coarse-gravel", CreepSoil.CoarseGravel),
        ("boulders", CreepSoil.Boulders),
        ("soft-clay", CreepSoil.SoftClay),
        ("medium-clay", CreepSoil.MediumClay),
        ("hard-clay", CreepSoil.HardClay),
        ("hardpan", CreepSoil.Hardpan));

    public static readonly Words<LoadDuration> Duration = new(
        ("permanent", LoadDuration.Permanent),
        ("long-term", LoadDuration.LongTerm),
        ("medium-term", LoadDuration.MediumTerm),
        ("short-term", LoadDuration.ShortTerm),
        ("instantaneous", LoadDuration.Instantaneous));

    public static readonly Words<LeakConvention> Leak = new(
        ("width", LeakConvention.Width),
        ("seal", LeakConvention.Seal));

    public static readonly Words<MaterialFamily> Family = new(
        ("aluminium", MaterialFamily.Aluminium),
        ("steel", MaterialFamily.Steel),
        ("timber", MaterialFamily.Timber),
        ("composite", MaterialFamily.Composite));

    public static readonly Words<BucklingClass> Buckling = new(
        ("A", BucklingClass.A),
        ("B", BucklingClass.B));

    public static readonly Words<StrengthReference> Reference = new(
        ("characteristic", StrengthReference.Characteristic),
        ("nds-reference", StrengthReference.NdsReference));
}
