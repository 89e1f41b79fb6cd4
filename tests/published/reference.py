"""Answers of Debian's python3-gsw and python3-geographiclib: one JSON request on stdin, one JSON answer on stdout.

Only arrays go in and come out, so that nothing of the comparison is decided here.
"""
import json
import os
import sys


def points(request):
    import gsw
    import numpy as np

    SA, CT, p = (np.array(request[name]) for name in ("SA", "CT", "p"))
    rho, alpha, beta = gsw.rho_alpha_beta(SA, CT, p)
    pt = gsw.pt_from_CT(SA, CT)
    t = gsw.t_from_CT(SA, CT, p)
    return {
        "rho": rho,
        "alpha": alpha,
        "beta": beta,
        "sigma0": gsw.sigma0(SA, CT),
        "pt": pt,
        "conductivity": gsw.C_from_SP(gsw.SP_from_SR(SA), t, p) / 10,
        "CT": gsw.CT_from_pt(SA, pt),
        "t": t,
        "pt0": gsw.pt0_from_t(SA, t, p),
        "freezing": gsw.CT_freezing_poly(SA, p, 1),
    }


def stability(request):
    import gsw
    import numpy as np

    SA, CT, p = (np.array(request[name]).T for name in ("SA", "CT", "p"))
    N2, _ = gsw.Nsquared(SA, CT, p)
    Tu, Rrho, _ = gsw.Turner_Rsubrho(SA, CT, p)
    return {"N2": N2.T, "Tu": Tu.T, "Rrho": Rrho.T}


def casts(_request):
    """The real casts that the library carries with its own check values."""
    import gsw
    import numpy as np

    data = np.load(os.path.join(os.path.dirname(gsw.__file__), "tests", "gsw_cv_v3_0.npz"))
    SP, t, p = (data[name].T for name in ("SP_chck_cast", "t_chck_cast", "p_chck_cast"))
    longitude, latitude = data["long_chck_cast"], data["lat_chck_cast"]
    SA = gsw.SA_from_SP(SP, p, longitude[:, None], latitude[:, None])
    CT = gsw.CT_from_t(SA, t, p)
    rho, alpha, beta = gsw.rho_alpha_beta(SA, CT, p)
    return {
        "SP": SP,
        "t": t,
        "p": p,
        "SA": SA,
        "CT": CT,
        "rho": rho,
        "alpha": alpha,
        "beta": beta,
        "rho_exact": gsw.rho_t_exact(SA, t, p),
        "latitude": latitude,
        "longitude": longitude,
    }


def salinity(request):
    import gsw
    import numpy as np

    SP, p, longitude, latitude = (np.array(request[name]) for name in ("SP", "p", "longitude", "latitude"))
    return {"SA": gsw.SA_from_SP(SP, p, longitude, latitude), "reference": gsw.SR_from_SP(SP)}


def earth(request):
    import gsw
    import numpy as np

    latitude, depth = np.array(request["latitude"]), np.array(request["depth"])
    return {"gravity": gsw.grav(latitude, 0), "p": gsw.p_from_z(-depth, latitude)}


def polygons(request):
    from geographiclib.geodesic import Geodesic

    areas, perimeters = [], []
    for ring in request["rings"]:
        polygon = Geodesic.WGS84.Polygon()
        for lon, lat in ring:
            polygon.AddPoint(lat, lon)
        _, perimeter, area = polygon.Compute(False, True)
        areas.append(abs(area))
        perimeters.append(perimeter)
    return {"area": areas, "perimeter": perimeters}


def lines(request):
    from geographiclib.geodesic import Geodesic

    inverse = [Geodesic.WGS84.Inverse(a[1], a[0], b[1], b[0]) for a, b in request["pairs"]]
    return {"distance": [line["s12"] for line in inverse], "bearing": [line["azi1"] for line in inverse]}


def plain(value):
    """Lists of numbers; null where the library has none."""
    if hasattr(value, "tolist"):
        value = value.tolist()
    if isinstance(value, list):
        return [plain(item) for item in value]
    if isinstance(value, float) and value != value:
        return None
    return value


request = json.load(sys.stdin)
answer = {
    "points": points,
    "stability": stability,
    "casts": casts,
    "salinity": salinity,
    "earth": earth,
    "polygons": polygons,
    "lines": lines,
}[request["ask"]](request)
json.dump({name: plain(value) for name, value in answer.items()}, sys.stdout)
