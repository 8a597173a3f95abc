/** Friction of round galvanized duct, standard air. */

export const publishedPoints = {
  source:
    "SMACNA HVAC Systems Duct Design 1990 (rows 1 to 4); Carrier System Design Manual, part 2 (row 5); a field duct-sizing sheet of 2005 (others)",
  standing: "found",
  why: "charts are read to two figures: 5 %; flows of the field sheet are rounded to trade steps, 5 % in flow is 10 % in loss. Points whose print disagrees with itself are left out.",
  rows: [
    { airflow_cfm: 6000, diameter_in: 27.1, printed_inwg_100ft: 0.095, tolerance: 0.05 },
    { airflow_cfm: 2000, diameter_in: 18.0, printed_inwg_100ft: 0.095, tolerance: 0.05 },
    { airflow_cfm: 1000, diameter_in: 13.9, printed_inwg_100ft: 0.095, tolerance: 0.05 },
    { airflow_cfm: 1000, diameter_in: 14.2, printed_inwg_100ft: 0.08, tolerance: 0.05 },
    { airflow_cfm: 5400, diameter_in: 24.1, printed_inwg_100ft: 0.145, tolerance: 0.05 },
    { airflow_cfm: 50, diameter_in: 5, printed_inwg_100ft: 0.06, tolerance: 0.1 },
    { airflow_cfm: 125, diameter_in: 7, printed_inwg_100ft: 0.06, tolerance: 0.1 },
    { airflow_cfm: 180, diameter_in: 8, printed_inwg_100ft: 0.06, tolerance: 0.1 },
    { airflow_cfm: 325, diameter_in: 10, printed_inwg_100ft: 0.06, tolerance: 0.1 },
    { airflow_cfm: 1200, diameter_in: 16, printed_inwg_100ft: 0.06, tolerance: 0.1 },
    { airflow_cfm: 2000, diameter_in: 20, printed_inwg_100ft: 0.06, tolerance: 0.1 },
  ],
} as const;
