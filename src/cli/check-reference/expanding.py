"""Expanding universes by astropy, and the integrals that astropy has no sharp answer for by scipy on astropy's E(z)."""

import math

from astropy import units as u
from astropy.cosmology import FlatLambdaCDM, Flatw0waCDM, LambdaCDM, w0waCDM
from scipy.integrate import quad

SETTINGS = {"epsabs": 0, "epsrel": 1e-13, "limit": 400}


def cosmology_of(parameters):
    """The universe with the calculators' own parameter names; one neutrino mass stands for all species."""
    masses = parameters.get("m_nu", [0])
    shared = {
        "H0": parameters["H0"],
        "Om0": parameters["Om0"],
        "Tcmb0": parameters.get("Tcmb0", 0),
        "Neff": parameters.get("Neff", 3.046),
        "m_nu": u.Quantity(masses[0] if len(masses) == 1 else masses, u.eV),
    }
    dark = {"w0": parameters.get("w0", -1), "wa": parameters.get("wa", 0)}
    evolves = dark != {"w0": -1, "wa": 0}
    if parameters.get("Ode0") is None:
        return Flatw0waCDM(**shared, **dark) if evolves else FlatLambdaCDM(**shared)
    shared["Ode0"] = parameters["Ode0"]
    return w0waCDM(**shared, **dark) if evolves else LambdaCDM(**shared)


def sharp_age(cosmology, z):
    """Age in Gyr with a relative tolerance, by a = s^2/(1+z)."""
    stretch = 1 + z
    value, _ = quad(
        lambda s: 2 / (s * float(cosmology.efunc(stretch / (s * s) - 1))), 0, 1, **SETTINGS
    )
    return value * cosmology.hubble_time.to_value(u.Gyr)


def sharp_horizon(cosmology, z):
    """Comoving particle horizon in Mpc."""
    stretch = 1 + z
    value, _ = quad(
        lambda s: 2 * stretch / (s**3 * float(cosmology.efunc(stretch / (s * s) - 1))),
        0,
        1,
        **SETTINGS,
    )
    return value * cosmology.hubble_distance.to_value(u.Mpc)


def sharp_path(cosmology, low, high):
    """Look-back time in Hubble times and comoving distance in Hubble distances, from one redshift to a higher one."""
    start = math.log1p(low)
    # From the difference, which near redshifts keep whole.
    width = math.log1p((high - low) / (1 + low))

    def rate(share):
        return 1 / float(cosmology.efunc(math.expm1(start + width * share)))

    time, _ = quad(rate, 0, 1, **SETTINGS)
    way, _ = quad(lambda share: math.exp(start + width * share) * rate(share), 0, 1, **SETTINGS)
    return time * width, way * width


def at_redshift(row):
    inputs = row["inputs"]
    z = inputs["z"]
    cosmology = cosmology_of(inputs["cosmology"])
    curvature = float(cosmology.Ok0)
    path = cosmology.comoving_distance(z).to_value(u.Mpc) / cosmology.hubble_distance.to_value(u.Mpc)
    sharp_time, sharp_way = sharp_path(cosmology, 0, z)
    past_equator = curvature < 0 and math.sqrt(-curvature) * path > math.pi / 2
    return {
        "age": cosmology.age(z).to_value(u.Gyr),
        "age by scipy": sharp_age(cosmology, z),
        "lookback by scipy": sharp_time * cosmology.hubble_time.to_value(u.Gyr),
        "lookback": cosmology.lookback_time(z).to_value(u.Gyr),
        "comoving_distance by scipy": sharp_way * cosmology.hubble_distance.to_value(u.Mpc),
        "comoving_distance": cosmology.comoving_distance(z).to_value(u.Mpc),
        "transverse": cosmology.comoving_transverse_distance(z).to_value(u.Mpc),
        "luminosity": cosmology.luminosity_distance(z).to_value(u.Mpc),
        "angular": cosmology.angular_diameter_distance(z).to_value(u.Mpc),
        "distmod": cosmology.distmod(z).value,
        "kpc_per_arcsec": cosmology.kpc_proper_per_arcmin(z).to_value(u.kpc / u.arcsec),
        "arcsec_per_kpc": cosmology.arcsec_per_kpc_proper(z).to_value(u.arcsec / u.kpc),
        # Past the equator of a closed space the arcsine form that astropy uses takes the wrong branch.
        "comoving_volume": math.nan
        if past_equator
        else cosmology.comoving_volume(z).to_value(u.Gpc**3),
        "E": cosmology.efunc(z),
        "H": cosmology.H(z).to_value(u.km / u.s / u.Mpc),
        "critical_density": cosmology.critical_density(z).to_value(u.kg / u.m**3),
        "Om": cosmology.Om(z),
        "Ode": cosmology.Ode(z),
        "Ogamma": cosmology.Ogamma(z),
        "Onu": cosmology.Onu(z),
        "Ok": cosmology.Ok(z),
        "particle_horizon by scipy": sharp_horizon(cosmology, z),
        "hubble_time": cosmology.hubble_time.to_value(u.Gyr),
        "hubble_distance": cosmology.hubble_distance.to_value(u.Mpc),
    }


def to_undo(row):
    """A known redshift, and the values that belong to it, for the inverses to find it again."""
    z = row["z"]
    cosmology = cosmology_of(row["cosmology"])
    sharp_time, sharp_way = sharp_path(cosmology, 0, z)
    way = sharp_way * cosmology.hubble_distance.to_value(u.Mpc)
    values = {
        "z_from_age": sharp_age(cosmology, z),
        "z_from_lookback": sharp_time * cosmology.hubble_time.to_value(u.Gyr),
        "z_from_comoving": way,
        "z_from_luminosity": (1 + z) * way,
    }
    return {kind: z for kind in values} | {f"{kind} value": value for kind, value in values.items()}


def between(row):
    inputs = row["inputs"]
    cosmology = cosmology_of(inputs["cosmology"])
    time, _ = sharp_path(cosmology, *sorted((inputs["z1"], inputs["z2"])))
    return {"duration": time * cosmology.hubble_time.to_value(u.Myr)}


FAMILIES = {
    "flat": at_redshift,
    "curved": at_redshift,
    "dark-energy": at_redshift,
    "heavy-neutrinos": at_redshift,
    "inverse": to_undo,
    "time-between": between,
}
