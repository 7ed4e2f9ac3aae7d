"""The steel class of many points, written with NumPy and SciPy: the yardstick of the atlas.

The same fields and formulas as the program, read from the same layer files, for the same points and
sea views (see SteelClassRun). Written as such programs usually are: one array per quantity over all
points, loops only over months, directions and samples. --chunk works the points off in pieces,
--processes on several cores.
"""

import argparse
import csv
import multiprocessing
import pathlib
import time

import numpy as np
import tifffile
from scipy.ndimage import map_coordinates
from scipy.special import erfc, ndtr

DIRECTIONS = 36
HEAD = 8  # numbers per point ahead of its sea view
MID_MONTH = np.array([15.5, 45, 74.5, 105, 135.5, 166, 196.5, 227.5, 258, 288.5, 319, 349.5])
LEVELS = np.array([0.1, 0.2, 0.3, 0.5, 1, 2, 3, 5, 10, 20, 30, 50, 60, 70, 80, 90, 95, 99])
LN_SPREAD = {"high": np.log(1.5), "medium": np.log(2), "low": np.log(3)}


class Layer:
    """A raster of points on a grid that goes round the world."""

    def __init__(self, path):
        with tifffile.TiffFile(path) as file:
            page = file.pages[0]
            values = page.asarray()
            transform = page.tags[34264].value
        self.bands = np.moveaxis(np.atleast_3d(values), 2, 0).astype(np.float64)
        if np.isnan(self.bands).any():
            raise ValueError(f"{path} has gaps, which this yardstick does not fill")
        self.step_lon, self.step_lat = transform[0], -transform[5]
        self.west = transform[3] + self.step_lon / 2
        self.north = transform[7] - self.step_lat / 2
        self.rows, self.columns = self.bands.shape[1:]

    def sample(self, band, lat, lon):
        y = np.clip((self.north - lat) / self.step_lat, 0, self.rows - 1)
        x = np.mod((lon - self.west) / self.step_lon, self.columns)
        # Only longitude goes round; latitude is held before, so the mode there never counts.
        return map_coordinates(self.bands[band], [y, x], order=1, mode="grid-wrap")


class Fields:
    def __init__(self, folder):
        self.folder = pathlib.Path(folder)
        self.temperature = self.layer("itu/temperature-monthly")
        self.density = self.layer("itu/vapour-density-exceedance")
        self.scale_height = self.layer("itu/vapour-scale-height")
        self.topography = self.layer("itu/vapour-topography")
        self.rain = self.layer("itu/rain-monthly")
        self.harmonic = self.layer("itu/vapour-pressure-harmonic")
        self.ground = self.layer("itu/temperature-height")
        self.elevation = self.layer("itu/elevation")
        self.marine_temperature = self.layer("marine/marine-air-temperature")
        self.marine_wind = self.layer("marine/marine-wind-speed")
        self.wind_u = self.layer("wind/wind-direction-monthly-u")
        self.wind_v = self.layer("wind/wind-direction-monthly-v")
        self.so2 = {}
        with open(self.folder / "tables/country-air.csv", encoding="utf-8") as file:
            rows = csv.DictReader(line for line in file if not line.startswith("#"))
            for row in rows:
                self.so2[row["country_code"]] = (
                    float(row["so2_city_ug_per_m3"]),
                    LN_SPREAD[row["so2_confidence"]],
                )

    def layer(self, name):
        return Layer(self.folder / f"{name}.tif")


def saturation(t):
    return 6.112 * np.exp(17.62 * t / (243.12 + t))


def logit_pct(p):
    return np.log(p / (100 - p))


def year_shape(t, rain):
    mean = t.mean(0)
    evaporation = np.maximum(0, t) * 5 + 5
    return dict(
        mean=mean,
        season=(t.max(0) - t.min(0)) / 20,
        warmth=np.clip(t, -30, 35) / 20,
        anomaly=(t - mean) / 10,
        rain=np.log1p(rain / 10),
        year_rain=np.log(rain.sum(0) + 30) - 6,
        wet=np.tanh(np.log((rain + 5) / evaporation)),
    )


def read_density(ln_density, exceeded):
    """Linear in the logit of the share exceeded, level by level."""
    x = logit_pct(exceeded)
    levels = logit_pct(LEVELS)
    at = np.clip(np.searchsorted(levels, x, side="left"), 1, len(levels) - 1)
    share = np.clip((x - levels[at - 1]) / (levels[at] - levels[at - 1]), 0, 1)
    low = np.take_along_axis(ln_density, (at - 1)[None], 0)[0]
    high = np.take_along_axis(ln_density, at[None], 0)[0]
    return low + share * (high - low)


def climate(f, lat, lon, elevation, sea_km):
    """Monthly temperature, humidity, wind and rain."""
    months = range(12)
    grid_t = np.array([f.temperature.sample(m, lat, lon) for m in months])
    rain = np.array([f.rain.sample(m, lat, lon) for m in months])
    marine_t = np.array([f.marine_temperature.sample(m, lat, lon) for m in months])
    marine_w = np.array([f.marine_wind.sample(m, lat, lon) for m in months])
    density = np.array([f.density.sample(b, lat, lon) for b in range(18)])
    scale = f.scale_height.sample(11, lat, lon)
    map_height = f.elevation.sample(0, lat, lon)
    around = np.zeros_like(lat)
    for i in (-1, 0, 1):
        for j in (-1, 0, 1):
            around += f.ground.sample(0, lat + 0.75 * i, lon + 0.75 * j) / 9

    departure = elevation - map_height
    small = np.clip(departure, -400, 400)
    height = map_height + 0.4 * small + (departure - small)
    map_above_free = (f.topography.sample(0, lat, lon) - height) / 1000
    around_above_free = (around - height) / 1000
    elevation_km = np.clip(height / 1000, 0, 4.5)
    map_above = np.clip(map_above_free, -2, 2)
    around_above = np.clip(around_above_free, -4, 4)
    latitude = np.abs(lat) / 90
    near_sea = np.exp(-sea_km / 50)
    phase = 2 * np.pi * (MID_MONTH - MID_MONTH[0]) / 365.25
    hemisphere = np.tanh(lat / 10)
    winter = np.cos(phase)[:, None] * hemisphere
    spring = np.sin(phase)[:, None] * hemisphere

    t20 = np.clip(grid_t, -40, 36) / 20
    temperature = grid_t + (
        1.5097
        + 3.0876 * around_above
        - 0.062769 * t20
        - 0.61627 * t20**2
        - 3.5626 * latitude
        - 0.51025 * winter
        - 0.025294 * elevation_km
        - 0.33317 * spring * latitude
        + 0.61156 * near_sea * np.clip(marine_t - grid_t, -10, 10) / 10
        + 0.21951 * near_sea * spring
        - 0.13627 * near_sea * winter
        + 1.0781 * around_above * t20
    )

    mean = f.harmonic.sample(0, lat, lon)
    cosine = f.harmonic.sample(3, lat, lon)
    sine = f.harmonic.sample(4, lat, lon)
    seasonal = np.array(
        [
            mean + cosine * np.cos(p) + sine * np.sin(p)
            for p in 2 * np.pi * MID_MONTH / 365.25
        ]
    )
    ln_density = np.log(np.maximum(1e-3, density))
    ln_saturation = np.log(saturation(temperature))
    ranked = np.empty_like(grid_t)
    for m in months:
        warmer = 100 * ndtr((grid_t - grid_t[m]) / np.sqrt(2)).mean(0)
        ranked[m] = (
            read_density(ln_density, warmer)
            + np.log((grid_t[m] + 273.15) / 216.7)
            + map_above_free / scale
            - ln_saturation[m]
        )
    a = np.clip(ranked, -3.5, 0.25)
    harmonic = np.log(np.maximum(seasonal, 0.02 * saturation(grid_t)))
    b = np.clip(harmonic + around_above_free / 2.3 - ln_saturation, -3.5, 0.25)
    y = year_shape(temperature, rain)
    t = y["warmth"]
    frost = np.minimum(0, t)
    spread = ln_density[8] - ln_density[15]
    marine = np.clip(marine_t - temperature, -10, 10)
    east = np.tanh((lon - 110) / 3) - np.tanh((lon - 156) / 3)
    north = np.tanh((lat + 45) / 3) - np.tanh((lat + 9) / 3)
    australia = east * north / 4
    logit = (
        1.9793
        + 0.44533 * a
        + 0.12921 * y["wet"]
        - 0.28196 * map_above
        - 0.1896 * elevation_km
        + 0.086602 * y["season"] * y["rain"]
        - 0.38043 * spring * latitude
        + 0.61764 * a.mean(0)
        - 0.15317 * frost**2
        - 0.52086 * near_sea * marine / 10
        + 0.096967 * np.roll(y["rain"], 1, axis=0)
        + 0.19675 * a * y["year_rain"]
        - 0.092416 * y["rain"] * a
        - 0.67645 * frost
        - 0.073292 * a * t
        + 0.083851 * a**2
        - 0.0037016 * near_sea * spring
        - 0.1221 * near_sea * winter
        + 0.19014 * b
        + 0.043455 * b**2
        - 0.11995 * spread
        + 0.0071083 * spread * y["anomaly"]
        - 0.44213 * y["anomaly"]
        - 0.43252 * spread * winter
        + 0.060978 * y["year_rain"]
        + 1.6653 * latitude**2
        - 1.2212 * latitude
        - 0.16269 * y["rain"]
        + 0.12334 * near_sea
        + 0.01587 * near_sea * a
        - 0.2355 * y["season"]
        - 0.47868 * t
        + 0.009954 * y["rain"] ** 2
        + 0.63229 * winter * latitude
        + 0.12164 * y["rain"] * t
        + 0.011946 * b.mean(0)
        - 0.073784 * elevation_km * winter
        - 0.45265 * australia
        + 0.15598 * australia * winter
    )
    humidity = 100 / (1 + np.exp(-logit))

    rh = humidity / 100
    wind10 = np.clip(marine_w.mean(0), 2, 10) / 10
    day_range = np.exp(
        2.4135
        + 2.0366 * rh
        - 2.6182 * rh**2
        - 0.19015 * near_sea * wind10
        - 0.13631 * y["rain"]
        + 0.063306 * y["year_rain"]
        + 0.088131 * y["rain"] * t
        - 0.31839 * rh * t
        + 0.15589 * t
        - 0.029424 * t**2
        + 0.21991 * near_sea * rh
        - 0.24748 * near_sea
        + 0.047562 * near_sea * latitude
        + 0.034212 * rh * elevation_km
        + 0.0719 * y["season"]
        + 0.02946 * winter
        - 0.080943 * rh * winter
        - 0.21603 * latitude
    )
    wind = np.maximum(
        0.5,
        0.16605
        + 0.068458 * np.exp(-sea_km / 200) * marine_w
        + 3.7647 * latitude
        + 0.31095 * marine_w
        + 0.33058 * spring
        - 0.80976 * map_above
        - 0.21286 * y["year_rain"]
        - 0.35511 * y["season"]
        - 0.032969 * day_range / 10
        + 0.26566 * t
        + 0.076483 * np.exp(-sea_km / 15) * marine_w
        - 1.5116 * latitude**2,
    )
    return temperature, humidity, wind, rain


def crest(f, lat, lon, elevation, azimuth, shore_km):
    """How far land up to the shore rises above the low marine air, m."""
    end = np.minimum(shore_km, 1000)
    phi = np.radians(lat)
    highest = np.maximum(0, elevation - 300)
    for i in range(1, 15):
        km = 10 + (end - 10) * (i / 14) ** 2
        arc = km / 6371.0088
        sine = np.sin(phi) * np.cos(arc) + np.cos(phi) * np.sin(arc) * np.cos(azimuth)
        to_lat = np.degrees(np.arcsin(np.clip(sine, -1, 1)))
        to_lon = lon + np.degrees(
            np.arctan2(
                np.sin(azimuth) * np.sin(arc) * np.cos(phi), np.cos(arc) - np.sin(phi) * sine
            )
        )
        highest = np.maximum(highest, f.elevation.sample(0, to_lat, to_lon) - 300)
    return np.where(np.isinf(shore_km) | (end < 20), 0, highest)


class Wind:
    """Hourly winds as normal about the month's mean vector."""

    def __init__(self, speed, u, v):
        length = np.hypot(u, v)
        self.mean = np.minimum(length, 0.9 * speed)
        safe = np.where(length > 0, length, 1)
        self.east = np.where(length > 0, u / safe, 0)
        self.north = np.where(length > 0, v / safe, 0)
        self.s2 = (speed**2 - self.mean**2) * 2 / np.pi
        self.sigma = np.sqrt(self.s2)

    def carried(self, azimuth, threshold, growth):
        cosine = -(self.east * np.sin(azimuth) + self.north * np.cos(azimuth))
        centre = self.mean * cosine + growth * self.s2
        lead = np.exp((centre**2 - self.mean**2) / (2 * self.s2) - growth * 5) / (
            2 * np.pi * self.s2
        )
        excess = (threshold - centre) / self.sigma
        gauss = self.s2 * np.exp(-(excess**2) / 2)
        tail = centre * self.sigma * np.sqrt(np.pi / 2) * erfc(excess / np.sqrt(2))
        return lead * (gauss + tail)


def chloride(f, lat, lon, elevation, sea_km, roughness, sea, wind, rain):
    """Annual median deposition, mg/(m² d)."""
    shore, fetch, salinity = sea
    full = np.minimum(1, sea_km / 0.5) * roughness
    shelter = np.exp(-0.65 * full - 0.3 * np.maximum(0, elevation) / 1000)
    washout = 1 + 0.5 * np.maximum(0, rain.sum(0) / 1000 - 1)
    winds = [
        Wind(
            np.clip(wind[m], 1.6, 8.5),
            1.3 * f.wind_u.sample(m, lat, lon),
            1.3 * f.wind_v.sample(m, lat, lon),
        )
        for m in range(12)
    ]
    still = Wind(np.array([5.0]), np.zeros(1), np.zeros(1))
    coarse_unit = DIRECTIONS * still.carried(0, 3, 0.16)
    fine_unit = DIRECTIONS * still.carried(0, 2, 0)
    total = np.full_like(lat, 0.1)
    for k in range(DIRECTIONS):
        azimuth = np.radians(10 * k)
        reached = ~np.isinf(shore[k])
        km = np.where(reached, shore[k], 0)
        over = np.exp(-crest(f, lat, lon, elevation, azimuth, shore[k]) / 1000 / 0.7)
        reaching = np.where(reached, salinity[k] * over, 0)
        total += 2 / DIRECTIONS * reaching * 5 * np.exp(-km * washout / 600)
        coarse = 2 * shelter * reaching * 70 * np.exp(-km / 0.2) * (1 - np.exp(-fetch[k] / 10))
        coarse = np.where(coarse > 1e-6, coarse, 0)
        fine = (
            2
            * shelter
            * reaching
            * 33
            * (km + 0.03) ** -0.24
            * np.exp(-km * washout / 400)
            * (1 - np.exp(-fetch[k] / 50))
        )
        for month in winds:
            total += fine * month.carried(azimuth, 2, 0) / fine_unit / 12
            total += coarse * month.carried(azimuth, 3, 0.16) / coarse_unit / 12
    return total


def surroundings(f, near, wide, light, country):
    """Roughness, SO2 deposition and its spread from people, lights and the country."""
    city = (near >= 100_000) | ((wide >= 1_000_000) & (light >= 150))
    town = (near >= 8_000) | ((wide >= 150_000) & (light >= 120))
    remote = (wide < 3_000) & (light < 55)
    conditions = [city, town, remote]
    roughness = np.select(conditions, [0.4, 0.3, 0.15], 0.2)
    over_city = np.select(conditions, [1, 0.65, 0.1], 0.35)
    level = np.full_like(near, 6.0)
    spread = np.full_like(near, LN_SPREAD["low"])
    for number in np.unique(country):
        code = chr(int(number) // 256) + chr(int(number) % 256) if number else ""
        if code in f.so2:
            here = country == number
            level[here], spread[here] = f.so2[code]
    return roughness, 0.8 * level * over_city, np.hypot(np.hypot(spread, 0.4), 0.4)


def median_loss(t, rh, pd, sd, t_spread, rh_spread, pd_spread, sd_spread=0.9):
    """Median first-year loss of carbon steel, µm."""
    outside = (
        ((t < -17.1) | (t > 28.7)).astype(int)
        + ((rh < 34) | (rh > 93))
        + (pd > 150.4)
        + (sd > 760.5)
    )
    own = np.hypot(0.405, 0.3 * np.sqrt(outside))
    pd = np.maximum(0.7, pd)
    sd = np.maximum(0.4, sd)

    def parts(t, rh):
        knee = t - 10
        f = np.where(knee <= 0, 0.150, -0.054) * knee
        return 1.77 * np.exp(0.020 * rh + f), 0.102 * np.exp(0.033 * rh + 0.040 * t)

    around = [
        parts(t, rh),
        parts(t - t_spread, rh),
        parts(t + t_spread, rh),
        parts(t, np.maximum(0, rh - rh_spread)),
        parts(t, np.minimum(100, rh + rh_spread)),
    ]
    inner, outer = np.sqrt(5 - np.sqrt(10)), np.sqrt(5 + np.sqrt(10))
    nodes = np.array([-outer, -inner, 0, inner, outer])
    light, heavy = (7 - 2 * np.sqrt(10)) / 60, (7 + 2 * np.sqrt(10)) / 60
    weights = np.array([light, heavy, 8 / 15, heavy, light])
    mu, sigma, weight = [], [], []
    for p in range(5):
        sulfur = np.maximum(0.7, pd * np.exp(nodes[p] * pd_spread)) ** 0.52
        for s in range(5):
            salt = np.maximum(0.4, sd * np.exp(nodes[s] * sd_spread)) ** 0.62
            at = [np.log(a * sulfur + c * salt) for a, c in around]
            mu.append(at[0])
            sigma.append(np.hypot(own, np.hypot((at[2] - at[1]) / 2, (at[4] - at[3]) / 2)))
            weight.append(weights[p] * weights[s])
    mu, sigma, weight = np.array(mu), np.array(sigma), np.array(weight)[:, None]
    low, high = (mu - 6 * sigma).min(0), (mu + 6 * sigma).max(0)
    x = (weight * mu).sum(0)
    for _ in range(60):
        z = (x - mu) / sigma
        f = (weight * ndtr(z)).sum(0) - 0.5
        slope = (weight / sigma * np.exp(-(z**2) / 2)).sum(0) / np.sqrt(2 * np.pi)
        high, low = np.where(f > 0, x, high), np.where(f > 0, low, x)
        step = x - f / slope
        step = np.where((step > low) & (step < high), step, (low + high) / 2)
        settled = np.abs(step - x).max() < 1e-9
        x = step
        if settled:
            break
    return np.exp(x)


def classes(f, points):
    """1 for C1 to 6 for CX."""
    lat, lon, elevation, sea_km, near, wide, light, country = points[:, :HEAD].T.astype(float)
    sea = points[:, HEAD:].T.astype(float).reshape(3, DIRECTIONS, -1)
    temperature, humidity, wind, rain = climate(f, lat, lon, elevation, sea_km)
    roughness, so2, so2_spread = surroundings(f, near, wide, light, country)
    salt = chloride(f, lat, lon, elevation, sea_km, roughness, sea, wind, rain)
    height = np.clip(elevation / 1000, 0, 4.5)
    loss = median_loss(
        temperature.mean(0),
        humidity.mean(0),
        so2,
        salt,
        0.54 + 0.50 * height,
        3.3 + 1.6 * height,
        so2_spread,
    )
    return np.searchsorted([1.3, 25, 50, 80, 200], loss, side="left").astype(np.uint8) + 1


FIELDS = None
POINTS = None


def piece(bounds):
    return classes(FIELDS, POINTS[bounds[0] : bounds[1]])


def main():
    global FIELDS, POINTS
    parser = argparse.ArgumentParser()
    parser.add_argument("data")
    parser.add_argument("points")
    parser.add_argument("out")
    parser.add_argument("--chunk", type=int, default=0)
    parser.add_argument("--processes", type=int, default=1)
    given = parser.parse_args()
    start = time.perf_counter()
    FIELDS = Fields(given.data)
    POINTS = np.memmap(given.points, dtype="<f4", mode="r").reshape(-1, HEAD + 3 * DIRECTIONS)
    n = len(POINTS)
    size = given.chunk or -(-n // given.processes)
    bounds = [(i, min(n, i + size)) for i in range(0, n, size)]
    if given.processes > 1:
        with multiprocessing.Pool(given.processes) as pool:
            done = pool.map(piece, bounds, chunksize=1)
    else:
        done = [piece(b) for b in bounds]
    np.concatenate(done).tofile(given.out)
    print(f"{n} points in {time.perf_counter() - start:.2f} s, imports not counted")


main()
