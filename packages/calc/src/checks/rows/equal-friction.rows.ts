/** Round diameters at exactly 0.1 in. of water per 100 ft, roughness 0.0003 ft, standard air. */

export const equalFrictionDiameters = {
  source: "Colebrook by a general fluids library with a root finder on the diameter",
  standing: "computed",
  relativeTolerance: 0.001,
  why: "constants of the trade's units move the diameter by less than 0.04 %",
  rows: [
    [100, 5.773972046, 549.95006],
    [200, 7.473034007, 656.61181],
    [400, 9.681548334, 782.42545],
    [800, 12.55411867, 930.65805],
    [1000, 13.65186605, 983.75867],
    [1500, 15.90147616, 1087.6496],
    [2000, 17.7219098, 1167.5663],
    [3000, 20.65156495, 1289.6977],
    [5000, 25.05042986, 1460.8723],
    [8000, 29.93099342, 1637.2701],
    [12000, 34.90751066, 1805.5774],
    [20000, 42.38469662, 2041.1948],
  ],
} as const;
