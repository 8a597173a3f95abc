/** Standard sections near a given one, in the order in which a shop would try them. */
import type { Section } from "../air-system.ts";
import { aspectRatio, sectionArea } from "../geometry/section.ts";
import { standardCandidates, type Candidate } from "../sizing/candidates.ts";

/** So many are tried before it is said that no near size helps. */
const MOST_TRIED = 10;

/** Larger ones, nearest first: of the same height, then of any, each with no more side ratio than is usual. */
export const largerThan = (section: Section): readonly Section[] =>
  nearest(section, (candidate) => candidate.area > sectionArea(section) * 1.001, 1);

export const smallerThan = (section: Section): readonly Section[] =>
  nearest(section, (candidate) => candidate.area < sectionArea(section) * 0.999, -1);

/** As large, with less metal between its sides: nearest to square last. */
export function squarerThan(section: Section): readonly Section[] {
  if (section.shape !== "rectangular" && section.shape !== "flat-oval") return [];
  const area = sectionArea(section);
  return standardCandidates[section.shape]
    .filter((each) => each.area >= area * 0.999 && aspectRatio(each.section) < aspectRatio(section))
    .slice(0, MOST_TRIED)
    .map((each) => each.section);
}

function nearest(section: Section, fits: (candidate: Candidate) => boolean, sign: 1 | -1): readonly Section[] {
  if (section.shape === "annular") return [];
  const height = section.shape === "round" ? null : section.height_m;
  const byArea = (candidates: readonly Candidate[]) =>
    [...candidates].sort((a, b) => sign * (a.area - b.area)).slice(0, MOST_TRIED);
  const fitting = standardCandidates[section.shape].filter(fits);
  const sameHeight = height === null ? fitting : fitting.filter((each) => Math.abs(each.height_m - height) < 1e-6);
  const others = height === null ? [] : fitting.filter((each) => !sameHeight.includes(each));
  return [...byArea(sameHeight), ...byArea(others)].map((each) => each.section);
}
