import type { RemedySettings, Run } from '../model.ts';
import { type Candidate, candidateOf, type Search, tryRun } from './candidate.ts';
import { cutRun } from './changed-run.ts';
import { withJointGaps } from './joint-gaps.ts';
import { fewestSlots } from './slot-remedy.ts';

/** A run cut into pieces that pass, and the gap between them [mm]. */
export interface CutCandidate {
  readonly pieces: readonly Candidate[];
  readonly gap: number;
}

/**
 * The fewest joints with which every piece of a run passes, with slots where they are needed: the run is cut at the
 * middle of spans into 2, 3, … pieces as equal as its fasteners allow. `null` where no number of joints passes within
 * the shortest piece and the widest gap that the user allows.
 */
export function fewestJoints(run: Run, search: Search): CutCandidate | null {
  const { shortestPiece } = search.job.remedies;
  for (let pieces = 2; ; pieces++) {
    const firsts = evenCuts(run.positions, pieces);
    if (firsts === null) return null;
    const shortest = Math.min(...cutRun(run, firsts, 0).map(fastenedLength));
    if (shortest < shortestPiece * (1 - 1e-9)) return null;
    const cut = tryCut(run, firsts, search);
    if (cut !== null) return cut;
  }
}

function tryCut(run: Run, firsts: readonly number[], search: Search): CutCandidate | null {
  const found = fewestSlotsOfEach(cutRun(run, firsts, 0), search);
  if (found === null) return null;
  const gap = gapFor(found, search.job.remedies);
  if (gap === null) return null;
  // the gap shortens the overhangs, so the pieces are screened again as they would be drawn
  const pieces = cutRun(run, firsts, gap).map((piece, p) => {
    const { roles, fasteners, slottedType } = found[p].assessment.run;
    const drawn = tryRun({ ...piece, roles, fasteners, slottedType }, search);
    return drawn && candidateOf(drawn, found[p].travel);
  });
  if (!pieces.every((piece) => piece !== null)) return null;
  const gaps = withJointGaps(pieces.map(({ assessment }) => assessment)).slice(0, -1);
  const passes = gaps.every(({ connections }) => connections.at(-1)?.verdict === 'ok');
  return passes ? { pieces, gap } : null;
}

/** Each piece with its fewest slots; pieces that are alike are searched once. */
function fewestSlotsOfEach(pieces: readonly Run[], search: Search): Candidate[] | null {
  const known = new Map<string, Candidate | null>();
  const found: Candidate[] = [];
  for (const piece of pieces) {
    const key = likeness(piece);
    const candidate = known.has(key) ? known.get(key)! : fewestSlots(piece, search);
    known.set(key, candidate);
    if (candidate === null) return null;
    found.push(candidate);
  }
  return found;
}

/** Pieces with the same distances and overhangs behave alike. */
function likeness({ positions, overhangs }: Run): string {
  const distances = Array.from(positions, (x) => (x - positions[0]).toFixed(6));
  return [...distances, overhangs.left.toFixed(6), overhangs.right.toFixed(6)].join(' ');
}

/** The width that the widest-moving joint needs, rounded up as the user draws gaps; `null` where it is too wide. */
function gapFor(pieces: readonly Candidate[], settings: RemedySettings): number | null {
  let needed = 0;
  for (let p = 1; p < pieces.length; p++) {
    const [left, right] = [pieces[p - 1].assessment, pieces[p].assessment];
    const closing = left.ends.right.outward.value + right.ends.left.outward.value;
    needed = Math.max(needed, closing + left.run.settingTolerance);
  }
  const gap = drawnGap(needed, settings);
  return gap <= settings.widestGap ? gap : null;
}

/** A gap of at least `needed`, in the steps that gaps are drawn in [mm]. */
export function drawnGap(needed: number, { gapStep }: RemedySettings): number {
  const steps = Math.max(1, Math.ceil((needed / gapStep) * (1 - 1e-9)));
  return Math.round(steps * gapStep * 1000) / 1000;
}

/**
 * First fastener of each piece but the first one, where cuts at mid-spans come nearest to even lengths; `null` where a
 * piece would have fewer than two fasteners.
 */
export function evenCuts(positions: Float64Array, pieces: number): number[] | null {
  const [first, last] = [positions[0], positions[positions.length - 1]];
  const cuts: number[] = [];
  for (let cut = 1; cut < pieces; cut++) {
    const ideal = first + ((last - first) * cut) / pieces;
    let nearest = (cuts.at(-1) ?? 0) + 2;
    for (let i = nearest; i <= positions.length - 2; i++) {
      if (offCentre(positions, i, ideal) < offCentre(positions, nearest, ideal) - 1e-9) nearest = i;
    }
    if (nearest > positions.length - 2) return null;
    cuts.push(nearest);
  }
  return cuts;
}

function offCentre(positions: Float64Array, i: number, ideal: number): number {
  return Math.abs((positions[i - 1] + positions[i]) / 2 - ideal);
}

function fastenedLength({ positions }: Run): number {
  return positions[positions.length - 1] - positions[0];
}
