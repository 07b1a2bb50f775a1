"""Everything that is no expanding universe: astropy where it has the thing, else the published formula in 80-bit numbers
or with scipy's special functions and solvers."""

import math

import numpy as np
from astropy import constants, units as u
from astropy.coordinates import Distance
from astropy.modeling.models import BlackBody
from astropy.units import imperial
from scipy import constants as codata
from scipy.integrate import quad, solve_ivp
from scipy.special import ellipkm1, lambertw, zeta

imperial.enable()
LONG = np.longdouble
SPECTRAL_BY_WAVELENGTH = u.W / u.m**2 / u.m / u.sr
SPECTRAL_BY_FREQUENCY = u.W / u.m**2 / u.Hz / u.sr


def glow(row):
    inputs = row["inputs"]
    where = (
        inputs["wavelength_nm"] * u.nm if "wavelength_nm" in inputs else inputs["frequency_Hz"] * u.Hz
    )
    body = inputs["T_K"] * u.K
    by_wavelength = BlackBody(body, scale=1 * SPECTRAL_BY_WAVELENGTH)
    by_frequency = BlackBody(body, scale=1 * SPECTRAL_BY_FREQUENCY)
    return {
        "B_lambda": by_wavelength(where).to_value(SPECTRAL_BY_WAVELENGTH),
        "B_nu": by_frequency(where).to_value(SPECTRAL_BY_FREQUENCY),
    }


def glow_in_all(row):
    kelvin = row["inputs"]["T_K"]
    x_wavelength = 5 + lambertw(-5 * math.exp(-5)).real
    x_frequency = 3 + lambertw(-3 * math.exp(-3)).real
    energy = codata.k * kelvin
    flux = float(constants.sigma_sb.value) * kelvin**4
    photons = 16 * math.pi * zeta(3) * (energy / (codata.h * codata.c)) ** 3
    density = 4 * flux / codata.c
    return {
        "peakWavelength": codata.h * codata.c / (x_wavelength * energy) * 1e9,
        "peakFrequency": x_frequency * energy / codata.h,
        "flux": flux,
        "photonDensity": photons,
        "energyDensity": density,
        "meanPhotonEnergy": density / photons / codata.e,
    }


def glow_in_band(row):
    inputs = row["inputs"]

    def x_of(nm):
        return codata.h * codata.c / (nm * 1e-9 * codata.k * inputs["T_K"])

    value, _ = quad(
        lambda x: x**3 / math.expm1(x),
        x_of(inputs["to_nm"]),
        x_of(inputs["from_nm"]),
        epsabs=0,
        epsrel=1e-13,
        limit=400,
    )
    return {"fraction": value * 15 / math.pi**4}


def photon(row):
    ((key, value),) = row["inputs"].items()
    unit = {"wavelength_nm": u.nm, "frequency_Hz": u.Hz, "energy_eV": u.eV}[key]
    given = value * unit
    wavelength = given.to(u.nm, u.spectral())
    return {
        "wavelength": wavelength.value,
        "frequency": given.to_value(u.Hz, u.spectral()),
        "energy": given.to_value(u.eV, u.spectral()),
        "energyJ": given.to_value(u.J, u.spectral()),
        "momentum": (constants.h / wavelength).to_value(u.kg * u.m / u.s),
    }


def conversion(row):
    given = row["value"] * u.Unit(row["from"])
    return {"value": given.to_value(u.Unit(row["to"]), u.temperature())}


def constant(row):
    if row["of"] == "scipy":
        value, _, uncertainty = codata.physical_constants[row["name"]]
        return {"value": value, "uncertainty": uncertainty}
    return {"value": getattr(constants, row["name"]).si.value}


def gamma_less_one(beta):
    # 1 - beta^2 loses digits near 1 in the first form, near 0 in the second.
    slow = abs(beta) < 0.5
    return np.expm1(-(np.log1p(-beta * beta) if slow else np.log1p(-beta) + np.log1p(beta)) / 2)


def kinematics(row):
    inputs = row["inputs"]
    beta = LONG(inputs["beta"])
    less_one = gamma_less_one(beta)
    light = LONG(codata.c)
    return {
        "gamma": 1 + less_one,
        "gamma_minus_1": less_one,
        "rapidity": np.arctanh(beta),
        "kineticEnergy": less_one * LONG(inputs["mass_kg"]) * light * light,
        "dilatedTime": (1 + less_one) * LONG(inputs["properTime_s"]),
        "z": np.sqrt((1 + beta) / (1 - beta)) - 1 if abs(beta) > 0.01 else np.expm1(np.arctanh(beta)),
        "transverse_z": less_one,
    }


def from_shift(row):
    z = LONG(row["z"])
    square = (1 + z) ** 2
    return {"beta": z * (2 + z) / (1 + square), "one_minus_beta": 2 / (1 + square)}


def added(row):
    a, b = LONG(row["inputs"]["beta1"]), LONG(row["inputs"]["beta2"])
    return {"beta": (a + b) / (1 + a * b)}


def anomaly(row):
    mean, e = LONG(row["inputs"]["M_rad"]), LONG(row["inputs"]["e"])
    low, high = mean - e - LONG(1e-9), mean + e + LONG(1e-9)
    # Halving cannot be led astray, and 80 bits need no more than this.
    for _ in range(90):
        middle = (low + high) / 2
        if middle - e * np.sin(middle) < mean:
            low = middle
        else:
            high = middle
    eccentric = (low + high) / 2
    half = eccentric / 2
    return {
        "E": eccentric,
        "trueAnomaly": 2 * np.arctan2(np.sqrt(1 + e) * np.sin(half), np.sqrt(1 - e) * np.cos(half)),
    }


def orbit(row):
    inputs = row["inputs"]
    axis, e = inputs["a_m"] * u.m, inputs["e"]
    pull = constants.G * (inputs["mass_kg"] * u.kg)
    return {
        "period": (2 * np.pi * np.sqrt(axis**3 / pull)).to_value(u.s),
        "vPeri": np.sqrt(pull * (2 / (axis * (1 - e)) - 1 / axis)).to_value(u.km / u.s),
        "vApo": np.sqrt(pull * (2 / (axis * (1 + e)) - 1 / axis)).to_value(u.km / u.s),
    }


def index_less_one(nm, formula):
    s2 = (LONG(1000) / nm) ** 2
    if formula == "ciddor1996":
        parts = LONG("5792105") / (LONG("238.0185") - s2) + LONG("167917") / (LONG("57.362") - s2)
        return parts * LONG("1e-8")
    if formula == "edlen1953":
        far = LONG("2.94981e-2") / (146 - s2) + LONG("2.5540e-4") / (41 - s2)
        return LONG("6.4328e-5") + far
    parts = LONG("8342.13") + LONG("2406030") / (130 - s2) + LONG("15997") / (LONG("38.9") - s2)
    return parts * LONG("1e-8")


def air(row):
    nm, formula = LONG(row["nm"]), row["formula"]
    low, high = nm, nm * LONG("1.001")
    for _ in range(80):
        middle = (low + high) / 2
        if middle / (1 + index_less_one(middle, formula)) < nm:
            low = middle
        else:
            high = middle
    lessened = index_less_one(nm, formula)
    return {"air": nm / (1 + lessened), "n_minus_1": lessened, "vacuum": (low + high) / 2}


def starlight(row):
    distance = Distance(parallax=row["parallax_mas"] * u.mas)
    return {
        "distance": distance.to_value(u.pc),
        "distanceLy": distance.to_value(u.lyr),
        "distmod": distance.distmod.value,
        "fluxRatio": (row["dm"] * u.mag).to_value(u.dimensionless_unscaled, u.logarithmic()),
        "Mbol": (row["L_W"] * u.W).to_value(u.M_bol),
    }


def pendulum(row):
    inputs = row["inputs"]
    slow = math.sqrt(inputs["L_m"] / inputs["g"])
    half = math.radians(inputs["theta0_deg"]) / 2
    return {"small": 2 * math.pi * slow, "exact": 4 * slow * ellipkm1(math.cos(half) ** 2)}


def thrown(row):
    i = row["inputs"]
    g = i["g_ms2"]
    drag = i["rho"] * i["Cd"] * math.pi * i["diameter_m"] ** 2 / (8 * i["mass_kg"])
    angle = math.radians(i["angle_deg"])

    def motion(_, state):
        _, _, vx, vy = state
        speed = math.hypot(vx, vy)
        return [vx, vy, -drag * speed * vx, -g - drag * speed * vy]

    def ground(_, state):
        return state[1]

    def top(_, state):
        return state[3]

    ground.terminal = True
    ground.direction = -1
    top.direction = -1
    start = [0, i["h0_m"], i["v0_ms"] * math.cos(angle), i["v0_ms"] * math.sin(angle)]
    path = solve_ivp(
        motion, (0, 1e4), start, method="DOP853", rtol=1e-12, atol=1e-12, events=[ground, top]
    )
    x, _, vx, vy = path.y_events[0][0]
    return {
        "range": x,
        "time": path.t_events[0][0],
        "apex": path.y_events[1][0][1],
        "impactSpeed": math.hypot(vx, vy),
        "terminalSpeed": math.sqrt(g / drag),
    }


FAMILIES = {
    "black-body": glow,
    "black-body-whole": glow_in_all,
    "black-body-band": glow_in_band,
    "photon": photon,
    "units": conversion,
    "constants": constant,
    "special-relativity": kinematics,
    "shift-to-speed": from_shift,
    "speeds-added": added,
    "kepler-equation": anomaly,
    "orbit": orbit,
    "air": air,
    "starlight": starlight,
    "pendulum": pendulum,
    "projectile": thrown,
}
