/** Air by altitude and temperature. */

export const altitude = {
  source: "U.S. Standard Atmosphere 1976 by a general fluids library; dry density at 70 °F by the perfect gas law",
  standing: "computed",
  relativeTolerance: 0.001,
  why: "geometric against geopotential altitude and the rounded exponent differ by up to 1.7e-4; 1e-3 leaves room for the gas constant",
  rows: [
    [0, 101325.0, 1.1995596],
    [1000, 97716.74, 1.1568424],
    [2000, 94213.569, 1.1153693],
    [3000, 90813.114, 1.0751122],
    [4000, 87513.043, 1.0360436],
    [5000, 84311.057, 0.9981361],
    [6000, 81204.898, 0.96136311],
    [7000, 78192.342, 0.92569827],
    [8000, 75271.205, 0.89111571],
    [9000, 72439.336, 0.85758996],
    [10000, 69694.62, 0.82509601],
  ],
} as const;

export const altitudeOfTheHandbook = {
  source: "ASHRAE Handbook Fundamentals, ch. 1, by an open psychrometrics library",
  standing: "computed",
  relativeTolerance: 1e-5,
  why: "same formula; rows printed to eight digits",
  rows: [
    [0, 101325.0, 1.2041519],
    [500, 95460.812, 1.1344615],
    [1000, 89874.519, 1.0680737],
    [1500, 84555.932, 1.0048674],
    [2000, 79495.124, 0.94472443],
    [2500, 74682.426, 0.88753006],
    [3000, 70108.422, 0.83317235],
  ],
} as const;

export const viscosity = {
  source: "Sutherland's law, U.S. Standard Atmosphere 1976, eq. 51",
  standing: "computed",
  relativeTolerance: 1e-6,
  why: "closed form, rows printed to eight digits",
  rows: [
    [-30, 1.5635728e-5],
    [-20, 1.6153263e-5],
    [-10, 1.666149e-5],
    [0, 1.7160793e-5],
    [10, 1.7651534e-5],
    [15, 1.7893803e-5],
    [20, 1.8134059e-5],
    [21.1111111, 1.818718e-5],
    [25, 1.8372342e-5],
    [30, 1.8608692e-5],
    [40, 1.9075743e-5],
    [50, 1.9535502e-5],
    [60, 1.9988245e-5],
    [80, 2.0873715e-5],
    [100, 2.1734082e-5],
    [150, 2.3786137e-5],
    [200, 2.5714478e-5],
  ],
} as const;

export const dryDensity = {
  source: "an open psychrometrics library at sea level",
  standing: "computed",
  relativeTolerance: 0.0001,
  why: "gas constants differ in the sixth digit",
  rows: [
    [-20, 0.09021949],
    [0, 0.08629409],
    [32, 0.0806777],
    [55, 0.07707231],
    [68, 0.07517351],
    [70, 0.07488966],
    [80, 0.07350196],
    [100, 0.07087534],
    [120, 0.06842998],
    [150, 0.06506275],
    [200, 0.06013128],
    [400, 0.0461419],
  ],
} as const;

export const saturation = {
  source: "steam tables (IAPWS-IF97)",
  standing: "memory",
  relativeTolerance: 0.001,
  why: "the two formulations differ by less than 0.05 % in this range",
  rows: [
    [0.01, 611.657],
    [20, 2339.3],
    [25, 3169.9],
    [50, 12352],
    [100, 101420],
  ],
} as const;
