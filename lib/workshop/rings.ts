/**
 * The ring planner: which rings, of which sheets, and what to take off the tube, bring a vent to a
 * tuning. The length of rings that meets it is solved once; the mixes near that length are then
 * found by counting, and each plan that is shown is evaluated exactly.
 */
import { InputError } from "@/lib/acoustics/input-error";
import { RingBench, meet } from "./ring-reach";
import { Shortlist, visitMixes, type RankedMix } from "./ring-mixes";
import { planOf, type PlanDraft } from "./ring-plan";
import type { RingPlan, RingRequest } from "./ring-request";

export type { RingPlan, RingRequest } from "./ring-request";

/** Plans shown of each kind. */
const SHOWN = 5;
/** Mixes evaluated exactly before the best whole-ring plans are chosen. */
const WEIGHED = 24;
/** Clearance behind a trimmed vent that the search goes down to [m]. */
const LEAST_CLEARANCE_M = 0.001;

/**
 * Plans that bring a vent to a tuning, best first: with trimming allowed the exact ones (fewest
 * rings, then fewest sheets, then least off the tube), then those of whole rings, nearest in tuning
 * first, then fewer rings.
 *
 * @returns at most a dozen plans; there is always the best of whole rings, and with trimming the
 * best exact one wherever the saw can make it
 * @throws InputError where no ring can be planned, none can be built, or the tuning lies outside
 * what the sheets, `max_rings`, the tube and the room can reach (the range is said)
 */
export function planRings(
  request: RingRequest,
  options: { vent_losses: boolean } = { vent_losses: request.vent_losses ?? true },
): { plans: RingPlan[] } {
  const bench = new RingBench(request, options);
  const steps = request.sheets.map((sheet) => sheet.thickness_m + request.glue_line_m);
  const wanted = request.tuning_hz;
  const reach = reachOf(bench, steps);
  refuseOutOfReach(bench, reach);
  const atNet = (x: number) => (reach ? bench.tuningAtNet(x, reach.shortest) : null);
  const met = reach ? meet(atNet, wanted, reach.low, reach.high) : null;
  const longest = reach?.longest ?? 0;
  const aim = met ?? ((atNet(longest) ?? 0) > wanted ? longest : (reach?.shortest ?? 0));
  const whole = new Shortlist(WEIGHED, byDistance(aim));
  const wholeOfOne = new Shortlist(2, byDistance(aim));
  const none = request.sheets.map(() => 0);
  whole.offer(none, 0);
  if (reach)
    visitMixes(steps, aim, request.max_rings, (counts, length) => {
      if (length > longest + 1e-9) return;
      whole.offer(counts, length);
      if (isOfOne(counts)) wholeOfOne.offer(counts, length);
    });
  const drafts: PlanDraft[] = distinct([...whole.best, ...wholeOfOne.best]).map((ranked) => ({
    ...ranked,
    trim_m: 0,
  }));
  const wholePlans = chooseWhole(build(bench, drafts));
  const exactPlans = bench.mostTrim_m > 0 ? exactTrims(bench, met, steps) : [];
  const plans = [...exactPlans, ...wholePlans];
  if (plans.length === 0)
    throw (
      bench.refusal ??
      new InputError("no_plan", "sheets", "No rings of these sheets can be built into this vent.")
    );
  return { plans: plans.map(({ plan }) => plan) };
}

interface Built {
  draft: PlanDraft;
  plan: RingPlan;
}

function build(bench: RingBench, drafts: PlanDraft[]): Built[] {
  return drafts.flatMap((draft) => {
    const plan = planOf(bench, draft);
    return plan ? [{ draft, plan }] : [];
  });
}

/** Nearest in tuning first, then fewer rings; the best of one sheet is kept beside mixed ones. */
function chooseWhole(built: Built[]): Built[] {
  const miss = ({ plan }: Built) => Math.abs(plan.error_hz);
  built.sort((a, b) =>
    Math.abs(miss(a) - miss(b)) > 1e-7 ? miss(a) - miss(b) : a.draft.rings - b.draft.rings,
  );
  const shown = built.slice(0, SHOWN);
  const ofOne = built.find(({ draft }) => draft.kinds <= 1);
  if (ofOne && !shown.includes(ofOne)) shown.push(ofOne);
  const best = shown[0];
  shown.forEach((item) => {
    const low = item.plan.error_hz < 0;
    const off = `${Math.abs(item.plan.error_hz).toFixed(2)} Hz ${low ? "below" : "above"} the target`;
    const near = miss(item) < 0.005 ? "on the target" : off;
    const start =
      item === best
        ? "Nearest without touching the tube"
        : item === ofOne
          ? "Nearest of one sheet alone"
          : "Whole rings only";
    const helps =
      item === best && item.draft.kinds > 1 && ofOne ? ", nearer than one sheet alone" : "";
    item.plan.reason = `${start}: ${near}${helps}.`;
  });
  return shown;
}

/** Plans that meet the tuning exactly by trimming the tube. */
function exactTrims(bench: RingBench, met: number | null, steps: number[]): Built[] {
  const { request } = bench;
  const least = request.trim_loss_m;
  const drafts: PlanDraft[] = [];
  const bareTrim = meet((x) => bench.tuning([], -x), request.tuning_hz, -mostBareTrim(bench), 0);
  if (bareTrim !== null && -bareTrim >= least - 1e-9)
    drafts.push({
      mix: request.sheets.map(() => 0),
      length_m: 0,
      rings: 0,
      kinds: 0,
      trim_m: -bareTrim,
    });
  if (met !== null) {
    const few = new Shortlist(SHOWN, byWork);
    const fine = new Shortlist(2, (a, b) => a.length_m - b.length_m || byWork(a, b));
    const ofOne = new Shortlist(1, byWork);
    visitMixes(steps, met + least, request.max_rings, (counts, length) => {
      const trim = length - met;
      if (trim < least - 1e-9 || trim > bench.mostTrim_m || length <= 0) return;
      few.offer(counts, length);
      fine.offer(counts, length);
      if (isOfOne(counts)) ofOne.offer(counts, length);
    });
    for (const ranked of distinct([...ofOne.best, ...few.best.slice(0, 3), ...fine.best]))
      drafts.push({ ...ranked, trim_m: ranked.length_m - met });
  }
  drafts.sort(byWork);
  const leastTrim = Math.min(...drafts.map(({ trim_m }) => trim_m));
  const built = build(bench, drafts);
  built.forEach(({ draft, plan }, i) => {
    if (draft.rings === 0) plan.reason = "Meets the target by trimming the tube; no rings needed.";
    else if (i === 0)
      plan.reason = "Meets the target with the fewest rings; the tube is trimmed to suit.";
    else if (draft.trim_m === leastTrim)
      plan.reason = "Meets the target with the least taken off the tube.";
    else plan.reason = "Meets the target; the tube is trimmed to suit.";
    if (draft.kinds > 1 && i > 0)
      plan.reason = plan.reason.replace("Meets the target", "Mixed thicknesses: meets the target");
  });
  return built;
}

const byWork = (a: RankedMix, b: RankedMix) =>
  a.rings - b.rings || a.kinds - b.kinds || a.length_m - b.length_m;

const byDistance = (aim: number) => (a: RankedMix, b: RankedMix) => {
  const [far, near] = [Math.abs(a.length_m - aim), Math.abs(b.length_m - aim)];
  return Math.abs(far - near) > 1e-9 ? far - near : a.rings - b.rings || a.kinds - b.kinds;
};

function isOfOne(counts: readonly number[]): boolean {
  return counts.filter((count) => count > 0).length === 1;
}

function distinct(mixes: RankedMix[]): RankedMix[] {
  const seen = new Set<string>();
  return mixes.filter(({ mix }) => {
    const key = mix.join();
    return !seen.has(key) && seen.add(key);
  });
}

/** Most that may come off a tube without rings, both flares still finding room [m]. */
const mostBareTrim = (bench: RingBench) =>
  Math.max(0, Math.min(bench.mostTrim_m, -bench.shortestNet_m));

interface Reach {
  /** What one ring of the thinnest sheet adds [m]. */
  shortest: number;
  /** The longest stack of whole rings there is room for [m]. */
  longest: number;
  /** Least and most that rings less trim can add [m]. */
  low: number;
  high: number;
}

/** Null where not even one ring finds room. */
function reachOf(bench: RingBench, steps: number[]): Reach | null {
  const most = bench.request.max_rings;
  const room = bench.room_m;
  if (steps.length === 0 || most < 1) return null;
  const shortest = Math.min(...steps);
  const all = most * Math.max(...steps);
  const full = new Shortlist(1, (a, b) => b.length_m - a.length_m);
  visitMixes(steps, Math.min(room, all), most, (counts, length) => {
    if (length <= room) full.offer(counts, length);
  });
  const longest = full.best[0]?.length_m ?? 0;
  const high = Math.max(
    longest,
    bench.mostTrim_m > 0 ? Math.min(room - LEAST_CLEARANCE_M, all - bench.request.trim_loss_m) : 0,
  );
  const low = Math.max(shortest - bench.mostTrim_m, bench.shortestNet_m);
  return longest > 0 || high > shortest ? { shortest, longest, low, high } : null;
}

/** Refuses a tuning beyond all plans by more than half a ring, and says what can be reached. */
function refuseOutOfReach(bench: RingBench, reach: Reach | null): void {
  const { tuning_hz: wanted } = bench.request;
  const atNet = (x: number) => (reach ? bench.tuningAtNet(x, reach.shortest) : null);
  const found = [
    bench.tuning([], 0),
    bench.tuning([], mostBareTrim(bench)),
    reach && atNet(reach.low),
    reach && atNet(reach.high),
  ].filter((f): f is number => f !== null);
  if (found.length === 0)
    throw (
      bench.refusal ??
      new InputError("no_plan", "sheets", "No rings of these sheets can be built into this vent.")
    );
  const highest = Math.max(...found);
  const lowest = Math.min(...found);
  // Whole rings may be the nearest there is though the target lies a little beyond them.
  const before = reach ? atNet(reach.high - reach.shortest / 2) : null;
  const slackLow = before === null ? 0 : Math.max(0, before - lowest);
  const first = reach && bench.mostTrim_m === 0 ? atNet(reach.shortest) : null;
  const slackHigh = first === null ? 0 : Math.max(0, (highest - first) / 2);
  if (wanted >= lowest - slackLow && wanted <= highest + slackHigh) return;
  throw new InputError(
    "tuning_out_of_reach",
    "tuning_hz",
    `Rings of these sheets do not bring the vent to ${wanted} Hz.`,
    `${lowest.toFixed(2)} to ${highest.toFixed(2)} Hz`,
  );
}
