using CaptureZone.Sites;

namespace CaptureZone.Tests.Sites.Reading;

/// <summary>
/// Each line is one mistake in an otherwise good file: the part of the small site that is replaced, what stands there instead,
/// and every complaint that comes of it, with its line and column. What a user reads is asserted to the letter.
/// </summary>
public sealed class BrokenSiteTests
{
    public static TheoryData<string, string, string[]> Syntax => new()
    {
        {
            "title = \"Small site\"",
            "title: \"Small site\"",
            ["2:6: error: a key and its value are parted by \"=\", not \":\"; write title = \"Small site\""]
        },
        {
            "title = \"Small site\"",
            "title = \"Small site",
            ["2:9: error: the text is not closed; put \" at its end"]
        },
        {
            "title = \"Small site\"",
            "title = Small site",
            ["2:9: error: Small site must stand in quotes; write title = \"Small site\""]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = 18 m/d",
            ["6:16: error: 18 m/d must stand in quotes; write conductivity = \"18 m/d\""]
        },
        {
            "porosity = 0.24",
            "porosity = .24",
            ["9:12: error: .24 needs a digit before its point; write 0.24"]
        },
        {
            "porosity = 0.24",
            "porosity = 0,24",
            ["9:12: error: 0,24 has a comma; decimals are written with a point: 0.24"]
        },
        {
            "[aquifer]",
            "[aquifer",
            ["5:1: error: the header is not closed; write [aquifer]"]
        },
        {
            "gradient = 0.0031",
            "gradient = 00.0031",
            ["12:12: error: 00.0031 begins with a zero too many; write 0.0031"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [560400.0, 4642100.0",
            ["15:11: error: the list that begins here is not closed; put ] at its end"]
        },
        {
            "date = 2026-12-01",
            "date = 2026-02-30",
            ["42:8: error: 2026-02-30 is no date of the calendar"]
        },
        {
            "porosity = 0.24",
            "porosity =",
            ["9:11: error: porosity has no value; write one after \"=\", or leave the line out"]
        },
        {
            "porosity = 0.24",
            "porosity = 0.24 0.25",
            ["9:12: error: 0.24 0.25 must stand in quotes; write porosity = \"0.24 0.25\""]
        },
        {
            "porosity = 0.24",
            "porosité = 0.24",
            ["9:8: error: this is not TOML: Expecting `=` after a key instead of é"]
        },
        {
            "title = \"Small site\"",
            "title = \"a\\qb\"",
            ["2:12: error: the text of title is not a TOML text: Unexpected escape character [q] in string. Only b t n f r e \\ \" xHH u0000-uFFFF ..."]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0],\n  [562200.0, 4641300.0]",
            ["33:11: error: the list that begins here is not closed; put ] at its end"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            ["33:22: error: the value of outline is not TOML: Missing a `,` to separate items in an array"]
        },
        {
            "conductivity = \"18 m/d\"\n",
            "conductivity = \"18 m/d\"\nconductivity = \"19 m/d\"\n",
            ["7:1: error: \"conductivity\" is already given on line 6; keep one of the two"]
        },
        {
            "[regional_flow]",
            "[aquifer]",
            [
                "1:1: error: the site file lacks the table [regional_flow]",
                "11:2: error: \"aquifer\" is already given on line 5; keep one of the two",
            ]
        },
        {
            "title = \"Small site\"",
            "title = \"a\"\ntitle.b = 2",
            ["3:1: error: \"title\" is already given on line 2; keep one of the two"]
        },
        {
            "[[well]]\nname = \"RW-1\"",
            "[well]\nname = \"RW-1\"",
            [
                "17:2: error: well must be written [[well]], once for each; found single brackets",
                "24:3: error: \"well\" has other brackets on line 17; write its headers the same way",
            ]
        },
        {
            "[zones]",
            "[zones]\n[zones.more]",
            ["37:8: error: [zones] has no key \"more\"; it takes travel_times, extent"]
        },
    };

    public static TheoryData<string, string, string[]> TopLevel => new()
    {
        {
            "format = 1\n",
            "",
            ["1:1: error: the site file lacks format; add a line such as format = 1"]
        },
        {
            "format = 1\n",
            "format = 2\n",
            ["1:10: error: format = 2 cannot be; it must be 1, the only format that this version reads"]
        },
        {
            "format = 1\n",
            "format = \"1\"\n",
            ["1:10: error: format must be a number without a unit, such as 1; found the text \"1\""]
        },
        {
            "title = \"Small site\"",
            "title = \"\"",
            ["2:9: error: title is empty; write title = \"Larkspur Plating Works, chromium plume\", with your own text, or leave it out"]
        },
        {
            "title = \"Small site\"",
            "titel = \"Small site\"",
            ["2:1: error: the site file has no key \"titel\"; did you mean \"title\"?"]
        },
        {
            "title = \"Small site\"",
            "title = 12",
            ["2:9: error: title must be a text in quotes, such as \"Larkspur Plating Works, chromium plume\"; found the number 12"]
        },
        {
            "crs = \"EPSG:26914\"\n",
            "",
            ["1:1: error: the site file lacks crs; add a line such as crs = \"EPSG:26914\""]
        },
        {
            "crs = \"EPSG:26914\"",
            "crs = \"EPSG:4326\"",
            ["3:7: error: 'EPSG:4326' is longitude/latitude (WGS 84), not a plane system in metres or feet; use a projected system, such as the site's UTM zone: EPSG:326zz (WGS 84, north), EPSG:327zz (WGS 84, south), EPSG:269zz (NAD83) or EPSG:258zz (ETRS89), where zz is 1 + the whole part of (longitude + 180) / 6"]
        },
        {
            "crs = \"EPSG:26914\"",
            "crs = \"plant.prj\"",
            ["3:7: error: 'plant.prj' is not there; put the definition there, or give an EPSG code such as \"EPSG:32614\""]
        },
        {
            "crs = \"EPSG:26914\"",
            "crs = \"local yards\"",
            ["3:7: error: 'local yards' is not a coordinate system; local coordinates are \"local m\" or \"local ft\""]
        },
        {
            "[[backdrop]]",
            "[[stream]]\nname = \"Otter Run\"\n\n[[backdrop]]",
            ["47:3: error: this version does not compute with \"stream\" yet; the file must leave it out"]
        },
        {
            "[[backdrop]]",
            "[sizing]\ndesign_factor = 1.5\n[[scenario]]\nname = \"dry\"\n[[backdrop]]",
            [
                "47:2: error: this version does not compute with \"sizing\" yet; the file must leave it out",
                "49:3: error: this version does not compute with \"scenario\" yet; the file must leave it out",
            ]
        },
        {
            "[[backdrop]]",
            "[wells]\n\n[[backdrop]]",
            ["47:2: error: the site file has no key \"wells\"; did you mean \"well\"?"]
        },
    };

    public static TheoryData<string, string, string[]> Aquifer => new()
    {
        {
            "conductivity = \"18 m/d\"",
            "conductivity = 18",
            ["6:16: error: conductivity lacks a unit; write \"18 m/d\", with the unit that it is in"]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivty = \"18 m/d\"",
            ["6:1: error: [aquifer] has no key \"conductivty\"; did you mean \"conductivity\"?"]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"18\"",
            ["6:16: error: conductivity: '18' has no unit; a hydraulic conductivity is expected, such as \"18 m/d\""]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"18 m2/d\"",
            ["6:16: error: conductivity: '18 m2/d' is a transmissivity; a hydraulic conductivity is expected, such as \"18 m/d\""]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"18,5 m/d\"",
            ["6:16: error: conductivity: '18,5 m/d' is not read as a number; write it with '.' as the decimal sign and nothing between thousands, such as \"1234.5 m/d\""]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"-18 m/d\"",
            ["6:16: error: conductivity = \"-18 m/d\" cannot be; it must be above 0"]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"18 furlongs\"",
            ["6:16: error: conductivity: unknown unit 'furlongs'; a hydraulic conductivity is expected, such as \"18 m/d\""]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = [\"18 m/d\"]",
            ["6:16: error: conductivity must be a quantity with its unit in quotes, such as \"18 m/d\"; found a list"]
        },
        {
            "conductivity = \"18 m/d\"\n",
            "conductivity = \"18 m/d\"\ntransmissivity = \"216 m2/d\"\n",
            ["7:18: error: both conductivity and transmissivity are given; leave one of the two out"]
        },
        {
            "conductivity = \"18 m/d\"\n",
            "",
            ["5:1: error: [aquifer] lacks conductivity; add a line such as conductivity = \"18 m/d\""]
        },
        {
            "conductivity = \"18 m/d\"\nbase = \"212 m\"\ntop = \"224 m\"",
            "transmissivity = \"216 m2/d\"\nbase = \"212 m\"",
            [
                "6:18: error: transmissivity needs a top, since conductivity = transmissivity / (top - base); add top, or give conductivity",
                "44:1: error: \"aquifer.conductivity\" is not given in this file, so it has no source; leave the line out",
            ]
        },
        {
            "top = \"224 m\"",
            "top = \"212 m\"",
            ["8:7: error: top lies at or below base; both are elevations, and top is the higher one"]
        },
        {
            "porosity = 0.24",
            "porosity = 24",
            ["9:12: error: porosity = 24 cannot be; it must be above 0 and at most 1"]
        },
        {
            "porosity = 0.24",
            "porosity = \"24 %\"",
            ["9:12: error: porosity must be a number without a unit, such as 0.25; found the text \"24 %\""]
        },
        {
            "porosity = 0.24",
            "porosity = nan",
            ["9:12: error: porosity = nan cannot be; it must be above 0 and at most 1"]
        },
        {
            "porosity = 0.24\n",
            "",
            ["5:1: error: [aquifer] lacks porosity; add a line such as porosity = 0.25"]
        },
        {
            "base = \"212 m\"\n",
            "",
            ["5:1: error: [aquifer] lacks base; add a line such as base = \"212 m\""]
        },
        {
            "[aquifer]",
            "[aquifier]",
            ["5:2: error: the site file has no key \"aquifier\"; did you mean \"aquifer\"?"]
        },
        {
            "[aquifer]",
            "[[aquifer]]",
            ["5:3: error: aquifer must be a table, written once as [aquifer]; found double brackets"]
        },
    };

    public static TheoryData<string, string, string[]> RegionalFlow => new()
    {
        {
            "gradient = 0.0031",
            "gradient = -0.0031",
            ["12:12: error: gradient = -0.0031 cannot be; it must be 0 or more"]
        },
        {
            "gradient = 0.0031",
            "gradient = 1e400",
            ["12:12: error: gradient = 1e400 cannot be; it must be 0 or more"]
        },
        {
            "flows_toward = 112",
            "flows_toward = 412",
            ["13:16: error: flows_toward = 412 cannot be; it must be 0 to 360 degrees"]
        },
        {
            "flows_toward = 112\n",
            "",
            ["11:1: error: [regional_flow] lacks flows_toward; add a line such as flows_toward = 112 (degrees clockwise from grid north)"]
        },
        {
            "head = \"238.6 m\"",
            "head = \"211 m\"",
            ["14:8: error: head lies at or below the aquifer's base; both are elevations on one datum"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [560400.0]",
            ["15:11: error: a place in head_at must be two numbers, [x, y], without units; found [560400.0]"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [\"560400 m\", \"4642100 m\"]",
            ["15:11: error: a place in head_at must be two numbers, [x, y], without units; found [\"560400 m\", \"4642100 m\"]"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [562300.1, 4641200.1]",
            ["15:11: error: head_at lies inside the screen of \"RW-1\"; choose a place outside the wells' influence"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [-98.27, 41.93]",
            ["15:11: error: (-98.27, 41.93) looks like longitude and latitude; NAD83 / UTM zone 14N takes eastings and northings in m: project the site's coordinates to a plane system, such as EPSG:32614 (WGS 84 / UTM zone 14N)"]
        },
        {
            "head_at = [560400.0, 4642100.0]",
            "head_at = [4642100.0, 560400.0]",
            ["15:11: error: (4642100, 560400) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone"]
        },
        {
            "head = \"238.6 m\"\n",
            "",
            ["11:1: error: [regional_flow] lacks head; add a line such as head = \"231.6 m\""]
        },
        {
            "head_at = [560400.0, 4642100.0]\n",
            "",
            ["11:1: error: [regional_flow] lacks head_at; add a line such as head_at = [561200.0, 4641900.0]"]
        },
        {
            "gradient = 0.0031",
            "gradient = \"3.1 m/km\"",
            ["12:12: error: gradient must be a number without a unit, such as 0.003; found the text \"3.1 m/km\""]
        },
    };

    public static TheoryData<string, string, string[]> Wells => new()
    {
        {
            "name = \"RW-2\"",
            "name = \"RW-1\"",
            ["25:8: error: the name \"RW-1\" is already taken on line 18; every [[well]] needs a name of its own"]
        },
        {
            "name = \"RW-2\"\n",
            "",
            ["24:1: error: [[well]] lacks name; add a line such as name = \"RW-1\""]
        },
        {
            "at = [562300.0, 4641300.0]",
            "at = [562300.0, 4641200.2]",
            ["26:6: error: the screen of \"RW-2\" overlaps that of \"RW-1\"; move one of the wells, or give both the same place"]
        },
        {
            "at = [562300.0, 4641300.0]",
            "at = [562300.0, inf]",
            ["26:6: error: a place in at must be two numbers, [x, y], without units; found [562300.0, inf]"]
        },
        {
            "extracts = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"other\"",
            "extracts = \"1.4 L/s\"\ninjects = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"other\"",
            ["28:11: error: a well either extracts or injects; leave one of the two out"]
        },
        {
            "extracts = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"other\"",
            "radius = \"0.15 m\"\npurpose = \"other\"",
            ["24:1: error: [[well]] lacks a rate; add a line such as extracts = \"6.5 L/s\" (\"0 L/s\" when it stands idle), or injects = ..."]
        },
        {
            "extracts = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"other\"",
            "extracts = \"-1.4 L/s\"\nradius = \"0 m\"\npurpose = \"other\"",
            [
                "27:12: error: extracts = \"-1.4 L/s\" cannot be; it must be 0 or more; extracts and injects say which way the water goes",
                "28:10: error: radius = \"0 m\" cannot be; it must be above 0",
            ]
        },
        {
            "purpose = \"containment\"",
            "purpose = \"contanment\"",
            ["22:11: error: purpose must be \"containment\", \"supply\" or \"other\"; found \"contanment\"; did you mean \"containment\"?"]
        },
        {
            "purpose = \"containment\"\n",
            "",
            ["17:1: error: [[well]] lacks purpose, which must be said where a plume is given: only wells for \"containment\" count as capture; add purpose = \"containment\", \"supply\" or \"other\""]
        },
        {
            "extracts = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"containment\"",
            "injects = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"containment\"",
            ["22:11: error: the purpose of a well that injects can only be \"other\", since capture counts what is extracted; leave it out"]
        },
        {
            "at = [562300.0, 4641200.0]\n",
            "",
            ["17:1: error: [[well]] lacks at; add a line such as at = [562310.0, 4641240.0]"]
        },
        {
            "radius = \"0.15 m\"\npurpose = \"other\"",
            "radius = 0.15\npurpose = other",
            [
                "28:10: error: radius lacks a unit; write \"0.15 m\", with the unit that it is in",
                "29:11: error: other must stand in quotes; write purpose = \"other\"",
            ]
        },
    };

    public static TheoryData<string, string, string[]> Plumes => new()
    {
        {
            "[[plume]]",
            "[plume]",
            ["31:2: error: plume must be written [[plume]], once for each; found single brackets"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [561800.0, 4641300.0]]",
            ["33:11: error: the outline needs at least 3 different corners; found 2"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0], [561800.0, 4641200.0]]",
            ["33:11: error: the outline crosses or touches itself at (562000, 4641250); give its corners in the order in which one walks round it"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562000.0, 4641300.0], [562200.0, 4641300.0]]",
            ["33:11: error: the outline has no area; its corners lie on one line"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0, 3], [562200.0, 4641300.0]]",
            ["33:35: error: a place in outline must be two numbers, [x, y], without units; found [562200.0, 4641200.0, 3]"]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]\n",
            "",
            ["31:1: error: [[plume]] lacks its outline; add outline = [[x, y], [x, y], [x, y]], or file = \"plume.geojson\""]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "file = \"plume.geojson\"",
            ["33:8: error: the file \"plume.geojson\" is not there"]
        },
        {
            "retardation = 1.4",
            "retardation = 0.4",
            ["34:15: error: retardation = 0.4 cannot be; it must be 1 or more"]
        },
        {
            "[[plume]]\nname = \"Cr\"",
            "[[plume]]\nname = \"Cr\"\nfile = \"a.geojson\"",
            [
                "33:8: error: the file \"a.geojson\" is not there",
                "33:8: error: [[plume]] has both outline and file; leave one of the two out",
            ]
        },
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[4641300.0, 561800.0], [4641200.0, 562200.0], [4641300.0, 562200.0]]",
            ["33:12: error: (4641300, 561800) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone"]
        },
    };

    public static TheoryData<string, string, string[]> ZonesAndReport => new()
    {
        {
            "travel_times = [\"1 yr\", \"5 yr\"]",
            "travel_times = \"5 yr\"",
            ["37:16: error: travel_times must be a list, such as [\"5 yr\"]; found the text \"5 yr\""]
        },
        {
            "travel_times = [\"1 yr\", \"5 yr\"]",
            "travel_times = [1, \"5 yr\"]",
            ["37:17: error: travel_times lacks a unit; write \"1 yr\", with the unit that it is in"]
        },
        {
            "travel_times = [\"1 yr\", \"5 yr\"]",
            "travel_times = [\"1 yr\", \"365.25 d\"]",
            ["37:25: error: \"365.25 d\" is the same time as \"1 yr\"; leave one of the two out"]
        },
        {
            "travel_times = [\"1 yr\", \"5 yr\"]",
            "travel_times = [\"1 yr\", \"0 yr\"]",
            ["37:25: error: travel_times = \"0 yr\" cannot be; it must be above 0"]
        },
        {
            "travel_times = [\"1 yr\", \"5 yr\"]",
            "travel_times = [\"1 yr\", \"2 yr\", \"3 yr\", \"4 yr\", \"5 yr\", \"6 yr\", \"7 yr\", \"8 yr\", \"9 yr\", \"10 yr\", \"11 yr\", \"12 yr\", \"13 yr\"]",
            ["37:16: error: travel_times has 13 times; at most 12 can be told apart on a map"]
        },
        {
            "extent = [560000.0, 4640000.0, 563000.0, 4643000.0]",
            "extent = [560000.0, 563000.0, 4640000.0, 4643000.0]",
            ["38:10: error: (4640000, 4643000) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone"]
        },
        {
            "extent = [560000.0, 4640000.0, 563000.0, 4643000.0]",
            "extent = [563000.0, 4640000.0, 560000.0, 4643000.0]",
            ["38:10: error: extent is [xmin, ymin, xmax, ymax]: the first number must be below the third, the second below the fourth"]
        },
        {
            "extent = [560000.0, 4640000.0, 563000.0, 4643000.0]",
            "extent = [560000.0, 4640000.0, 563000.0]",
            ["38:10: error: extent must be four numbers, [xmin, ymin, xmax, ymax]; found [560000.0, 4640000.0, 563000.0]"]
        },
        {
            "units = \"metric\"",
            "units = \"imperial\"",
            ["41:9: error: units must be \"metric\" or \"us\"; found \"imperial\""]
        },
        {
            "date = 2026-12-01",
            "date = \"2026-12-01\"",
            ["42:8: error: date must be a date without quotes, such as date = 2026-12-01; found the text \"2026-12-01\""]
        },
        {
            "date = 2026-12-01",
            "date = 2026-12-01T08:00:00",
            ["42:8: error: date must be a date without quotes, such as date = 2026-12-01; found a date or time"]
        },
        {
            "units = \"metric\"",
            "units = \"metric\"\nprojekt = \"x\"\nnumber = 3",
            [
                "42:1: error: [report] has no key \"projekt\"; did you mean \"project\"?",
                "43:1: error: [report] has no key \"number\"; it takes units, project, prepared_for, prepared_by, date, vertical_datum",
            ]
        },
    };

    public static TheoryData<string, string, string[]> SourcesAndBackdrops => new()
    {
        {
            "\"aquifer.conductivity\" = \"pumping test\"",
            "\"aquifer.conductvity\" = \"pumping test\"",
            ["45:1: error: \"aquifer.conductvity\" names no value of this file; did you mean \"aquifer.conductivity\"?"]
        },
        {
            "\"aquifer.conductivity\" = \"pumping test\"",
            "\"aquifer.conductivity\" = 3",
            ["45:26: error: a source must be a text in quotes, such as \"pumping test\"; found the number 3"]
        },
        {
            "[sources]\n",
            "[sources]\n\"regional_flow.porosity\" = \"x\"\n\"aquifer.transmissivity\" = \"y\"\n\"nowhere\" = \"z\"\n",
            [
                "45:1: error: \"regional_flow.porosity\" names no value of this file; did you mean \"regional_flow.gradient\"?",
                "46:1: error: \"aquifer.transmissivity\" is not given in this file, so it has no source; leave the line out",
                "47:1: error: \"nowhere\" names no value of this file; write the table, the name where there is one, and the key, such as \"well.RW-1.extracts\"",
            ]
        },
        {
            "line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]",
            "line = [[562000.0, 4641000.0]]",
            ["49:8: error: line needs at least 2 places; found 1"]
        },
        {
            "line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]",
            "line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]\npoints = [[562000.0, 4641000.0]]",
            ["50:10: error: [[backdrop]] has both line and points; leave one of the two out"]
        },
        {
            "line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]\n",
            "",
            ["47:1: error: [[backdrop]] lacks its shape; add one of outline, line, points or file"]
        },
    };

    public static TheoryData<string, string, string[]> Unusual => new()
    {
        {
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 464130.0]]",
            ["33:58: warning: (562200, 464130) lies more than 100 km from the rest of the site; are x and y swapped, or is a digit missing?"]
        },
        {
            "porosity = 0.24",
            "porosity = 0.6",
            ["9:12: warning: porosity = 0.6 is unusual; usual is 0.06 (sandstone; 35 Ill. Adm. Code 671, Appendix A) to 0.5 (sand; Freeze & Cherry 1979, Table 2.4, from memory)"]
        },
        {
            "gradient = 0.0031",
            "gradient = 0.2",
            ["12:12: warning: gradient = 0.2 is unusual; usual is 0.0001 to 0.05 (common practice, no source)"]
        },
        {
            "conductivity = \"18 m/d\"",
            "conductivity = \"5000 m/d\"",
            ["6:16: warning: conductivity = \"5000 m/d\" is unusual; usual is 0.00864 to 864 m/d (silty to clean sand; Freeze & Cherry 1979, Table 2.2, from memory)"]
        },
        {
            "retardation = 1.4",
            "retardation = 250",
            ["34:15: warning: retardation = 250 is unusual; usual is 1 to 100 (common practice, no source)"]
        },
    };

    [Theory]
    [MemberData(nameof(Syntax))]
    [MemberData(nameof(TopLevel))]
    [MemberData(nameof(Aquifer))]
    [MemberData(nameof(RegionalFlow))]
    [MemberData(nameof(Wells))]
    [MemberData(nameof(Plumes))]
    [MemberData(nameof(ZonesAndReport))]
    [MemberData(nameof(SourcesAndBackdrops))]
    [MemberData(nameof(Unusual))]
    public void A_mistake_is_told_with_its_place_and_how_to_mend_it(string part, string replacement, string[] complaints)
    {
        SiteReading reading = SmallSite.Read(SmallSite.With(part, replacement));
        Assert.Equal(complaints, SmallSite.Complaints(reading));
        Assert.Equal(reading.Complaints.Any(complaint => complaint.Severity == Severity.Error), reading.Document is null);
    }

    [Theory]
    [InlineData("  [562200.0 4641200.0],\n", "34:13: error: this is not TOML: Missing a `,` to separate items in an array")]
    [InlineData("  [562200.0, 4641200.O],\n", "34:14: error: this is not TOML: ")]
    [InlineData("  [562200.0, 4641200.0] x,\n", "34:25: error: this is not TOML: ")]
    [InlineData("  [562200.0, 4641200.0\n", "33:11: error: the list that begins here is not closed; put ] at its end")]
    public void A_slip_in_a_long_outline_is_told_on_its_own_line(string corner, string complaint)
    {
        SiteReading reading = SmallSite.Read(SmallSite.With(
            "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]",
            $"outline = [[561800.0, 4641300.0], [561900.0, 4641200.0],\n{corner}  [562200.0, 4641300.0],\n]"));
        Assert.StartsWith(complaint, SmallSite.Complaints(reading).Single(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\u0004[well]]")]
    [InlineData("[[well")]
    [InlineData("[well]]")]
    [InlineData("[ [well]")]
    public void A_broken_header_brings_no_complaints_of_the_keys_under_it(string header)
    {
        string text = SmallSite.With("[[well]]\nname = \"RW-2\"", $"{header}\nname = \"RW-2\"");
        Assert.Equal([24], SmallSite.Read(text).Complaints.Select(complaint => complaint.Line));
    }

    [Fact]
    public void All_mistakes_of_a_file_are_told_at_once_in_its_order()
    {
        string text = SmallSite.Text
            .Replace("\"Small site\"", "Small site", StringComparison.Ordinal)
            .Replace("\"18 m/d\"", "18", StringComparison.Ordinal)
            .Replace("porosity", "porosty", StringComparison.Ordinal)
            .Replace("[zones]", "[zones", StringComparison.Ordinal)
            .Replace("\"5 yr\"", "\"5 years ago\"", StringComparison.Ordinal)
            .Replace("name = \"RW-2\"", "name = \"RW-1\"", StringComparison.Ordinal)
            .Replace("\"pumping test\"", "7", StringComparison.Ordinal);
        SiteReading reading = SmallSite.Read(text);
        Assert.Equal([2, 6, 9, 25, 36, 37, 45], reading.Complaints.Select(complaint => complaint.Line));
    }

    [Theory]
    [InlineData("", "1:1: error: the file is empty; \"capturezone new FILE\" writes one to start from")]
    [InlineData("\n \n", "1:1: error: the file is empty; \"capturezone new FILE\" writes one to start from")]
    [InlineData("format = 2\nanything = 1\n", "1:10: error: format = 2 cannot be; it must be 1, the only format that this version reads")]
    [InlineData("x = [[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[", "1:74: error: brackets are nested too deeply here; a site file needs no more than four")]
    [InlineData("title = \"a\"\u0000\n", "1:12: error: the text of title is not a TOML text: Unexpected token found")]
    public void A_file_that_is_no_site_file_gets_one_plain_complaint(string text, string complaint)
    {
        SiteReading reading = SmallSite.Read(text);
        Assert.Null(reading.Document);
        Assert.StartsWith(complaint, SmallSite.Complaints(reading)[0], StringComparison.Ordinal);
    }
}
