#!/usr/bin/env python3
"""Recomputes shipped scenarios independently of the program.

Run from the top of the project, with NumPy and SciPy:  python3 sim-core/src/test/scipy/recompute.py
Writes the CSV files of sim-core/src/test/resources/recomputed, which RecomputationTest compares with.

The equations are written down here on their own: sideways velocity v in place of the sideslip, a mass
matrix solved at every instant, and SciPy's DOP853 at a relative tolerance of 1e-12 from sample to sample.
"""

import json
from pathlib import Path

import numpy as np
import scipy
from scipy.integrate import solve_ivp
from scipy.optimize import root

G0 = 9.80665
FT, LB = 0.3048, 0.45359237
SLUG = LB * G0 / FT
UNITS = {
    "s": 1, "m": 1, "ft": FT, "m2": 1, "ft2": FT**2, "kg": 1, "lb": LB, "kg m2": 1, "slug ft2": SLUG * FT**2,
    "m/s": 1, "ft/s": FT, "kt": 1852 / 3600, "kW": 1000, "rpm": 2 * np.pi / 60, "kg/m3": 1, "slug/ft3": SLUG / FT**3, "K": 1, "N m": 1,
    "deg": np.pi / 180, "rad": 1,
}
SCENARIOS = Path("scenarios")
OUT = Path("sim-core/src/test/resources/recomputed")
GIVEN = OUT / "aeroplanes"  # aeroplanes with given derivatives in place of those that follow from a shape


def si(text):
    number, unit = text.split(" ", 1)
    return float(number) * UNITS[unit]


def air(condition):
    """Density and true airspeed; U.S. Standard Atmosphere 1976 to 11 km, compressible pitot relation."""
    gas, h = 8314.32 / 28.9644, si(condition["pressureAltitude"])
    standard = 288.15 - 0.0065 * h
    pressure = 101325 * (standard / 288.15) ** (G0 / (gas * 0.0065))
    if "density" in condition:
        density = si(condition["density"])
    else:
        density = pressure / (gas * (standard + si(condition.get("temperatureOffset", "0 K"))))
    if "trueAirspeed" in condition:
        return density, si(condition["trueAirspeed"])
    sea_level_sound = np.sqrt(1.4 * gas * 288.15)
    impact = 101325 * ((1 + 0.2 * (si(condition["calibratedAirspeed"]) / sea_level_sound) ** 2) ** 3.5 - 1)
    mach = np.sqrt(5 * ((impact / pressure + 1) ** (2 / 7) - 1))
    return density, mach * np.sqrt(1.4 * pressure / density)


class Engine:
    """A propeller of fixed pitch that turns clockwise, with its engine, at one airspeed."""

    def __init__(self, given, condition):
        self.rated, self.lag = si(given["ratedPower"]), si(given["engineLag"])
        self.power = si(condition["power"])
        self.taken = 1 - given["straightened"]
        self.inertia = si(given["rotatingInertia"]["propeller"]) + si(given["rotatingInertia"]["engine"])
        # the cube of the speed is linear in the power; the condition gives one point of the line
        idle = given["speedWithoutPower"] ** 3
        here = idle + (1 - idle) * self.power / self.rated
        full = si(condition["propellerSpeed"]) ** 3 / here
        self.cube = np.array([(1 - idle) * full / self.rated, idle * full])

    def moment(self, power, rate):
        speed = np.polyval(self.cube, power) ** (1 / 3)
        return -self.taken * power / speed - self.inertia * self.cube[0] * rate / (3 * speed**2)


class Case:
    """One scenario: forces per (v, p, r, aileron, rudder), the mass matrix, and what the hands do."""

    def __init__(self, name):
        self.scenario = json.loads((SCENARIOS / f"{name}.json").read_text())
        plane = SCENARIOS / self.scenario["aeroplane"]
        if (GIVEN / plane.name).exists():
            plane = GIVEN / plane.name
        plane = json.loads(plane.read_text())
        density, self.speed = air(self.scenario["condition"])
        span, area, self.mass = si(plane["span"]), si(plane["wingArea"]), si(plane["mass"])
        inertia = {axis: si(value) for axis, value in plane["inertia"].items()}
        values = dict(plane["derivatives"]["values"])
        if plane["derivatives"].get("aileronSign") == "left-roll-positive":
            for key in ("CY_da", "Cl_da", "Cn_da"):
                values[key] = -values.get(key, 0)
        force, rate = 0.5 * density * self.speed**2 * area, span / (2 * self.speed)
        self.per = np.array([
            [arm * force * values.get(f"{axis}_{key}", 0) * scale for key, scale in
             (("beta", 1 / self.speed), ("p", rate), ("r", rate), ("da", 1), ("dr", 1))]
            for axis, arm in (("CY", 1), ("Cl", span), ("Cn", span))])
        self.inertia = inertia
        self.matrix = np.array([[self.mass, 0, 0],
                                [0, inertia["roll"], -inertia.get("product", 0)],
                                [0, -inertia.get("product", 0), inertia["yaw"]]])
        self.propeller = np.array([0, si(self.scenario["condition"].get("propellerRollMoment", "0 N m")), 0])
        self.engine = Engine(plane["propellers"][0], self.scenario["condition"]) if "power" in self.scenario["condition"] else None
        if self.engine:
            self.propeller[1] = self.engine.moment(self.engine.power, 0)
        self.full = 0.5 * (si(plane["ailerons"]["up"]) + si(plane["ailerons"]["down"]))
        if plane["rudder"]["left"] != plane["rudder"]["right"]:
            raise ValueError("one travel of the rudder is expected")
        self.full_rudder = -si(plane["rudder"]["right"])
        self.climb = si(self.scenario["condition"].get("flightPathAngle", "0 deg"))
        self.load_factor = np.cos(self.climb)
        self.trim(self.scenario.get("start", {}).get("trim", {}))
        self.corners = {"stick": [(0.0, 0.0)], "pedal": [(0.0, 0.0)], "power": [(0.0, 0.0)]}
        for move in self.scenario["inputs"]:
            start, hand, size = si(move["start"]), si(move["movement"]), move["size"]
            corners = self.corners[move["control"]]
            corners += [(start, corners[-1][1]), (start + hand, size)]
            if move["shape"] == "hold":
                back = start + si(move["duration"])
                corners += [(back, size), (back + hand, 0.0)]

    def trim(self, wanted):
        """Bank, rates, sideways velocity, aileron and rudder in which nothing changes."""
        state = wanted.get("state", "wings-level")
        self.bank = si(wanted["bank"]) if state == "steady-turn" else 0.0
        self.load_factor /= np.cos(self.bank)
        # a heading that turns by g tan(bank)/V, resolved along axes that climb and bank
        turn = G0 * np.tan(self.bank) / self.speed
        self.p = -turn * np.sin(self.climb)
        self.r = turn * np.cos(self.climb) * np.cos(self.bank)
        if state == "straight-sideslip":
            given = self.speed * si(wanted["sideslip"])  # the program's sideslip is v/V

            def unbalanced(x):
                aileron, rudder, bank = x
                q = G0 / self.speed * np.cos(self.climb) * (1 - np.cos(bank))
                p = -q * np.sin(bank) * np.tan(self.climb)
                load = self.per @ [given, p, 0, aileron, rudder] + self.propeller
                load[0] += self.mass * G0 * np.cos(self.climb) * np.sin(bank)
                return load / (self.mass * G0)

            answer = root(unbalanced, np.zeros(3), tol=1e-14)
            self.aileron, self.rudder, self.bank = answer.x
            q = G0 / self.speed * np.cos(self.climb) * (1 - np.cos(self.bank))
            self.p, self.r, self.slip = -q * np.sin(self.bank) * np.tan(self.climb), 0.0, given
        else:
            rest = self.per[:, [1, 2]] @ [self.p, self.r] + self.propeller
            self.slip, self.aileron, self.rudder = np.linalg.solve(self.per[:, [0, 3, 4]], -rest)

    def moved(self, control, time):
        return np.interp(time, *zip(*self.corners[control]))

    def stick(self, time):
        return self.aileron + self.full * self.moved("stick", time)

    def free(self, time, state):
        v, p, r, bank, power = state
        demand = self.engine.power + self.engine.rated * self.moved("power", time) if self.engine else 0
        power_rate = (demand - power) / self.engine.lag if self.engine else 0
        change = self.engine.moment(power, power_rate) - self.propeller[1] if self.engine else 0
        rudder = self.rudder + self.full_rudder * self.moved("pedal", time)
        load = self.per @ [v, p, r, self.stick(time), rudder] + self.propeller
        load[0] += self.mass * G0 * np.cos(self.climb) * np.sin(bank) - self.mass * self.speed * r
        load[1] += change
        q = G0 / self.speed * (self.load_factor - np.cos(self.climb) * np.cos(bank))
        return [*np.linalg.solve(self.matrix, load), p + (q * np.sin(bank) + r * np.cos(bank)) * np.tan(self.climb), power_rate]

    def slip_and_yaw(self, time, p, bank):
        """Sideways velocity and yaw rate that leave no side force and no yawing moment."""
        left = self.per[np.ix_([0, 2], [0, 2])].copy()
        left[0, 1] -= self.mass * self.speed
        right = self.per[[0, 2]] @ [0, p, 0, self.stick(time), self.rudder]
        right[0] += self.mass * G0 * np.sin(bank)
        return np.linalg.solve(left, -right)

    def settled(self, time, state):
        p, bank = state
        v, r = self.slip_and_yaw(time, p, bank)
        moment = self.per[1] @ [v, p, r, self.stick(time), self.rudder] + self.propeller[1]
        return [moment / self.inertia["roll"], p]

    def modes(self):
        a = np.zeros((4, 4))
        forces = self.per[:, :3].copy()
        forces[0, 2] -= self.mass * self.speed
        a[:3, :3] = np.linalg.solve(self.matrix, forces)
        a[:3, 3] = np.linalg.solve(self.matrix, [self.mass * G0, 0, 0])
        a[3, 1] = 1
        roots = np.linalg.eigvals(a)
        real = sorted(root.real for root in roots if abs(root.imag) < 1e-9)
        swing = next(root for root in roots if root.imag > 1e-9)
        return [("roll", real[0], 0.0), ("spiral", real[1], 0.0), ("dutchRoll", swing.real, swing.imag)]

    def history(self, slip, step=0.5):
        """Rows of time, bank, roll rate, yaw rate and sideslip, in deg; every corner and sample ends a step."""
        bank = self.bank + si(self.scenario.get("start", {}).get("bank", "0 deg"))
        power = self.engine.power if self.engine else 0
        state = np.array([self.slip, self.p, self.r, bank, power] if slip == "free" else [self.p, bank], float)
        samples = np.arange(round(si(self.scenario["duration"]) / step) + 1) * step
        stops = sorted({round(time, 12) for time in [*samples, *(corner[0] for corners in self.corners.values() for corner in corners)]})
        rows, equations = [], getattr(self, slip)
        for begin, end in zip([0.0, *stops], stops):
            if end > begin:
                piece = solve_ivp(equations, (begin, end), state, method="DOP853", rtol=1e-12, atol=1e-14)
                state = piece.y[:, -1]
            if np.min(np.abs(samples - end)) < 1e-9:
                if slip == "free":
                    v, p, r, bank, _ = state
                else:
                    (p, bank), (v, r) = state, self.slip_and_yaw(end, *state)
                rows.append([end, *np.degrees([bank, p, r, v / self.speed])])
        return rows


def main():
    head = f"# independent recomputation with SciPy {scipy.__version__} DOP853 rtol 1e-12, equations of motion written separately\n"
    for name, slip, suffix in (
            ("light-single-roll-entry", "free", ""), ("light-single-held-stick", "free", ""),
            ("light-single-wing-drop", "free", "-free"), ("light-single-wing-drop", "settled", "-settled"),
            ("tarnlark-cruise-roll-entry", "free", ""), ("large-jet-roll-entry", "free", ""),
            ("tarnlark-turn-reversal", "free", ""), ("tarnlark-climbing-turn", "free", ""),
            ("tarnlark-straight-sideslip", "free", ""), ("tarnlark-power-step", "free", "")):
        with open(OUT / f"{name}{suffix}.csv", "w", newline="\n") as file:
            file.write(head + f"# scenario {name}, {slip} slip\n")
            file.write("time[s],bank[deg],rollRate[deg/s],yawRate[deg/s],sideslip[deg]\n")
            for time, *values in Case(name).history(slip):
                file.write(f"{time:.1f}," + ",".join(f"{value + 0.0:.9e}" for value in values) + "\n")
    with open(OUT / "modes.csv", "w", newline="\n") as file:
        file.write(f"# independent recomputation with NumPy {np.__version__}, eigenvalues of the linearised equations of free"
                   " slip about wings level, equations of motion written separately\n"
                   "# scenario as in the file names beside; of the pair of the dutch roll the root with positive"
                   " imaginary part\ncase,mode,real[1/s],imag[1/s]\n")
        for name in ("light-single-roll-entry", "tarnlark-cruise-roll-entry", "large-jet-roll-entry"):
            for mode, real, imaginary in Case(name).modes():
                file.write(f"{name},{mode},{real:.9e},{imaginary:.9e}\n")


if __name__ == "__main__":
    main()
