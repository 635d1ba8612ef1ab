namespace BladeLog.Records.Folding;

/// <summary>The sums of one cut, in whole numbers so that sums kept equal sums recounted.</summary>
public static class CutSums
{
    /// <summary>Time in the wood: length of all pieces over the feed.</summary>
    public static long Milliseconds(double lengthM, int pieces, double feedMps) =>
        checked((long)Math.Round(lengthM * pieces / feedMps * 1000, MidpointRounding.AwayFromZero));

    public static long AreaMm2(double heightM, double lengthM, int pieces) =>
        checked((long)Math.Round(heightM * lengthM * pieces * 1e6, MidpointRounding.AwayFromZero));

    /// <summary>
    /// Wood path of each tooth: in the time l/f the blade makes v l/(f L) loops and each tooth passes the height h once a
    /// loop, so the path is A v/(f L) with A = h l.
    /// </summary>
    public static long PathMm(in CutLine cut, double loopM)
    {
        var area = cut.HeightM * cut.LengthM * cut.Pieces;
        return checked((long)Math.Round(area * cut.SpeedMps / (cut.FeedMps * loopM) * 1000, MidpointRounding.AwayFromZero));
    }
}
