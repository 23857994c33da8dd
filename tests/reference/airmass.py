"""Writes airmass.json: airmass and refraction by integrating rays through the standard atmosphere (ISO 2533, ICAO 1993:
layers to 84 km) with SciPy, in the manner by which the table of Kasten & Young 1989 was made (Appl. Opt. 28, 4735, eq. 1;
refractive index for 700 nm). Run: /usr/bin/python3 airmass.py
"""
import json
import math
import os

import scipy
from scipy.integrate import quad

EARTH_KM = 6371.229
REFRACTIVITY = 2.76e-4
GRAVITY, GAS, POTENTIAL_KM, TOP_KM = 9.80665, 287.05287, 6356.766, 84.0
# Geopotential height of the foot of a layer, km; temperature there, K; lapse, K/km.
LAYERS = [(0, 288.15, -6.5), (11, 216.65, 0), (20, 216.65, 1.0), (32, 228.65, 2.8), (47, 270.65, 0),
          (51, 270.65, -2.8), (71, 214.65, -2.0)]
ALTITUDES_DEG = [0, 0.5, 1, 1.5, 2, 3, 4, 5, 6, 8, 10, 12, 15, 20, 25, 30, 40, 50, 60, 70, 80, 90]


def pressure_above(pressure, layer, height_km):
    foot, temperature, lapse = layer
    rise = height_km - foot
    if lapse == 0:
        return pressure * math.exp(-GRAVITY * 1000 * rise / (GAS * temperature))
    return pressure * (1 + lapse * rise / temperature) ** (-GRAVITY * 1000 / (GAS * lapse))


PRESSURES = [101325.0]
for lower, upper in zip(LAYERS, LAYERS[1:]):
    PRESSURES.append(pressure_above(PRESSURES[-1], lower, upper[0]))


def density(height_km):
    geopotential = POTENTIAL_KM * height_km / (POTENTIAL_KM + height_km)
    at = max(i for i, layer in enumerate(LAYERS) if geopotential >= layer[0])
    foot, temperature, lapse = LAYERS[at]
    return pressure_above(PRESSURES[at], LAYERS[at], geopotential) / (GAS * (temperature + lapse * (geopotential - foot)))


GROUND = density(0)
EDGES = [0] + [POTENTIAL_KM * layer[0] / (POTENTIAL_KM - layer[0]) for layer in LAYERS[1:]] + [TOP_KM]


def through_layers(function):
    """Integral over height; the root of the height takes the spike of a level ray away."""
    return sum(quad(lambda root: 2 * root * function(root * root), math.sqrt(low), math.sqrt(high), epsabs=0,
                    epsrel=1e-10, limit=800)[0] for low, high in zip(EDGES, EDGES[1:]))


def index(height_km):
    return 1 + REFRACTIVITY * density(height_km) / GROUND


def ray(altitude_deg):
    """Airmass, and refraction in degrees, of a ray that comes in at an apparent altitude."""
    across = index(0) * EARTH_KM * math.cos(math.radians(altitude_deg))

    def steepness(height):
        sine = across / (index(height) * (EARTH_KM + height))
        return sine, math.sqrt(max(1e-18, (1 - sine) * (1 + sine)))

    def bending(height):
        step = 1e-4
        low = max(0, height - step)
        slope = (index(height + step) - index(low)) / (height + step - low)
        sine, cosine = steepness(height)
        return -slope / index(height) * sine / cosine

    airmass = through_layers(lambda height: density(height) / steepness(height)[1]) / through_layers(density)
    refraction = 0 if altitude_deg == 90 else math.degrees(through_layers(bending))
    return dict(apparentDeg=altitude_deg, airmass=airmass, refractionDeg=refraction)


if __name__ == '__main__':
    table = dict(source=f'rays through the standard atmosphere, SciPy {scipy.__version__}',
                 rays=[ray(altitude) for altitude in ALTITUDES_DEG])
    with open(os.path.join(os.path.dirname(os.path.abspath(__file__)), 'airmass.json'), 'w') as file:
        json.dump(table, file, indent=1)
        file.write('\n')
