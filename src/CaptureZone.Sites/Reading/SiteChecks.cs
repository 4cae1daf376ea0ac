using CaptureZone.Sites.Reading.Sections;

namespace CaptureZone.Sites.Reading;

/// <summary>Checks between the tables of a file.</summary>
internal static class SiteChecks
{
    /// <summary>Adds what is wrong between tables.</summary>
    /// <param name="draft">The file as it stands.</param>
    /// <param name="site">What all readers share.</param>
    public static void Check(SiteDraft draft, SiteContext site)
    {
        PlaceChecks.Check(site);
        CheckHead(draft, site.Complaints);
        double unit = site.Coordinates?.MetresPerUnit ?? double.NaN;
        CheckScreens(draft, site.Complaints, unit);
        CheckHeadPlace(draft, site.Complaints, unit);
    }

    private static void CheckHead(SiteDraft draft, Complaints complaints)
    {
        if (draft.Regional?.Head is { } head && draft.Aquifer is { } aquifer && head <= aquifer.Base)
        {
            complaints.Error(draft.Regional.HeadOffset, "head lies at or below the aquifer's base; both are elevations on one datum");
        }
    }

    private static void CheckScreens(SiteDraft draft, Complaints complaints, double unit)
    {
        for (int i = 1; i < draft.Wells.Length; i++)
        {
            WellDraft well = draft.Wells[i];
            if (draft.Wells[..i].FirstOrDefault(other => Overlap(well, other, unit)) is { } near)
            {
                complaints.Error(
                    well.Offset,
                    $"the screen of {Words.Quote(well.Name ?? "")} overlaps that of {Words.Quote(near.Name ?? "")}; "
                    + "move one of the wells, or give both the same place");
            }
        }
    }

    private static bool Overlap(WellDraft a, WellDraft b, double unit) =>
        a.At is { } here && b.At is { } there && !here.Equals2D(there) && here.Distance(there) * unit < a.Radius + b.Radius;

    private static void CheckHeadPlace(SiteDraft draft, Complaints complaints, double unit)
    {
        if (draft.Regional?.HeadAt is { } at
            && draft.Wells.FirstOrDefault(well => well.At is { } place && place.Distance(at) * unit <= well.Radius) is { } inside)
        {
            complaints.Error(
                draft.Regional.HeadAtOffset,
                $"head_at lies inside the screen of {Words.Quote(inside.Name ?? "")}; choose a place outside the wells' influence");
        }
    }
}
