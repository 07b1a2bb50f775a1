"""astropy’s side of the bench. One JSON line in, one out:

{"cell": "…", "values": 5}     its answers to the first five inputs
{"cell": "…", "seconds": 0.2}  how often it does the work of the cell in a second of processor
"""

import json
import math
import sys
import time
import warnings

import numpy as np
from astropy import constants as k, units as u
from astropy.coordinates import Distance
from astropy.cosmology import FlatLambdaCDM, Planck18, z_at_value
from astropy.modeling.models import BlackBody

warnings.simplefilter("ignore")

# The same inputs as the other side: call i has share (i mod 1000) / 1000 of the way.
POINTS = np.arange(1000) / 1000
BY_WAVELENGTH = u.W / u.m**2 / u.m / u.sr
BY_FREQUENCY = u.W / u.m**2 / u.Hz / u.sr


def everything(z):
    """What astropy has of the outputs of cosmo.at_z."""
    p = Planck18
    answers = (
        p.age(z), p.lookback_time(z), p.lookback_distance(z), p.comoving_distance(z),
        p.comoving_transverse_distance(z), p.luminosity_distance(z), p.angular_diameter_distance(z),
        p.distmod(z), p.kpc_proper_per_arcmin(z), p.arcsec_per_kpc_proper(z), p.comoving_volume(z),
        p.efunc(z), p.H(z), p.critical_density(z), p.Tcmb(z), p.scale_factor(z), p.Om(z), p.Ode(z),
        p.Ogamma(z), p.Onu(z), p.Ok(z),
    )  # fmt: skip
    return answers[5].to_value(u.Mpc)


def new_universe(share):
    # H0 is one number to astropy: there is no array of universes.
    cosmology = FlatLambdaCDM(H0=60 + 20 * share, Om0=0.3, Tcmb0=2.7255, Neff=3.046)
    return cosmology.luminosity_distance(1).value


def glow(share):
    where = (200 + 2000 * share) * u.nm
    by_wavelength = BlackBody(5772 * u.K, scale=1 * BY_WAVELENGTH)(where)
    BlackBody(5772 * u.K, scale=1 * BY_FREQUENCY)(where)
    return by_wavelength.value


def glow_in_all(share):
    body = BlackBody((3000 + 9000 * share) * u.K)
    return (body.lambda_max.to_value(u.nm), body.nu_max, body.bolometric_flux)[0]


def photon(share):
    wavelength = (100 + 900 * share) * u.nm
    energy = wavelength.to(u.eV, u.spectral())
    return (
        energy.value,
        wavelength.to(u.Hz, u.spectral()),
        energy.to(u.J),
        (k.h / wavelength).to(u.kg * u.m / u.s),
    )[0]


def observed(share):
    wavelength = 121.567 * u.nm * (1 + 12 * share)
    return (wavelength.value, wavelength.to(u.Hz, u.spectral()), wavelength.to(u.eV, u.spectral()))[0]


def speed_of_shift(share):
    rest = 656.4614 * u.nm
    return (rest * (1.01 + share)).to_value(u.km / u.s, u.doppler_relativistic(rest))


def orbit(share):
    axis, e, pull = (1e11 + 1e12 * share) * u.m, 0.2, k.G * (1.98841e30 * u.kg)
    period = (2 * math.pi * np.sqrt(axis**3 / pull)).to_value(u.s)
    for distance in (axis * (1 - e), axis * (1 + e)):
        np.sqrt(pull * (2 / distance - 1 / axis)).to(u.km / u.s)
    return period


def body(share):
    mass, radius = (1e24 + 1e25 * share) * u.kg, 6.371e6 * u.m
    escape = np.sqrt(2 * k.G * mass / radius).to_value(u.km / u.s)
    (k.G * mass / radius**2).to(u.m / u.s**2)
    (mass / (4 / 3 * math.pi * radius**3)).to(u.kg / u.m**3)
    np.sqrt(k.G * mass / radius).to(u.km / u.s)
    (k.G * mass / (radius * k.c**2)).to(u.one)
    return escape


def parallax(share):
    distance = Distance(parallax=(1 + 50 * share) * u.mas)
    return (distance.to_value(u.pc), distance.to(u.lyr), distance.distmod)[0]


def travel(share):
    way = (1 + 100 * share) * u.pc
    return ((way / k.c).to_value(u.s), (way / k.c).to(u.yr), way.to(u.lyr), way.to(u.au))[0]


def energy(share):
    return ((1 + 100 * share) * u.eV).to_value(u.J)


def size(share):
    angle = 2 * np.arctan((1 + share) * u.m / (2 * 100 * u.m))
    return (angle.to_value(u.arcsec), angle.to(u.deg), (4 * math.pi * np.sin(angle / 4) ** 2))[0]


def redshift(share):
    return 0.01 + 10 * share


CELLS = {
    "cosmo.at_z": lambda s: everything(redshift(s)),
    "distance": lambda s: Planck18.luminosity_distance(redshift(s)).value,
    "cosmo.at_z, new universe": new_universe,
    "cosmo.inverse": lambda s: z_at_value(Planck18.age, (0.5 + 12 * s) * u.Gyr).value,
    "cosmo.age_diff": lambda s: (Planck18.age(redshift(s)) - Planck18.age(20)).to_value(u.Myr),
    "blackbody.planck": glow,
    "blackbody.total": glow_in_all,
    "photon.convert": photon,
    "line.observe": observed,
    "doppler.beta_from_z": speed_of_shift,
    "orbit.kepler": orbit,
    "gravity.body": body,
    "stars.magnitude": parallax,
    "light.travel": travel,
    "energy.convert": energy,
    "angle.size": size,
}


def work_of(cell):
    """What is done at call i; a curve takes all 1000 points at one go, as astropy likes it best."""
    if cell.startswith("curve "):
        return lambda _: CELLS[cell.removeprefix("curve ")](POINTS)
    return lambda i: CELLS[cell]((i % 1000) / 1000)


def rate_of(work, seconds):
    start = time.process_time()
    end = start + seconds
    done = 0
    while time.process_time() < end:
        work(done)
        done += 1
    return done / (time.process_time() - start)


for line in sys.stdin:
    asked = json.loads(line)
    work = work_of(asked["cell"])
    if "values" in asked:
        if asked["cell"].startswith("curve "):
            answer = {"values": [float(value) for value in work(0)[: asked["values"]]]}
        else:
            answer = {"values": [float(work(i)) for i in range(asked["values"])]}
    else:
        answer = {"rate": rate_of(work, asked["seconds"])}
    print(json.dumps(answer), flush=True)
