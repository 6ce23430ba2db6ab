/** The volume ledger: from the gross inside to the air that acts as the spring, and back. */
import { airProperties } from "@/lib/acoustics/air";
import { InputError } from "@/lib/acoustics/input-error";
import { lengthForTuning } from "@/lib/acoustics/length";
import { modelVent } from "@/lib/acoustics/vent";
import type { Design, Vent } from "@/lib/document/schema";

export interface LedgerLine {
  kind: "gross" | "driver" | "vent" | "braces";
  /** In words, as in "Front port × 2". */
  name: string;
  /** Positive for the gross volume, negative for what is taken off it. */
  volume_m3: number;
}

export interface Ledger {
  lines: LedgerLine[];
  /** Sum of the lines. */
  net_volume_m3: number;
  /** Set in the design less the ledger's net: positive where the design counts on more air than there is. */
  excess_m3: number;
}

export interface LedgerOptions {
  /** Braces, linings, whatever else is solid inside [m³]. */
  braces_m3?: number;
  vent_losses?: boolean;
}

/**
 * Gross inside volume less driver, vents (outer envelope inside the panel, bore air and wood
 * together) and braces [m³].
 *
 *     V_net = w h d − n V_driver − Σ n_v V_v − V_braces
 *
 * @returns null where the inside dimensions are not given
 * @source dossier of the trade, 5.1
 */
export function ledgerOf(design: Design, options: LedgerOptions = {}): Ledger | null {
  const inside = design.enclosure.inside_m;
  if (!inside) return null;
  const air = airProperties(design.air);
  const losses = { vent_losses: options.vent_losses ?? true };
  const lines: LedgerLine[] = [
    { kind: "gross", name: "Gross inside", volume_m3: inside.width * inside.height * inside.depth },
  ];
  const { driver } = design;
  if (driver?.displacement_m3)
    lines.push({
      kind: "driver",
      name: times("Driver", driver.count),
      volume_m3: -driver.count * driver.displacement_m3,
    });
  design.vents.forEach((vent, i) => {
    const { figures } = modelVent(vent, design.enclosure, air, losses, `design.vents[${i}]`);
    if (figures.displaced_volume_m3 > 0)
      lines.push({
        kind: "vent",
        name: times(vent.name, vent.count),
        volume_m3: -vent.count * figures.displaced_volume_m3,
      });
  });
  if (options.braces_m3)
    lines.push({ kind: "braces", name: "Braces", volume_m3: -options.braces_m3 });
  const net = lines.reduce((sum, line) => sum + line.volume_m3, 0);
  return {
    lines,
    net_volume_m3: net,
    excess_m3: design.enclosure.net_volume_m3 - net,
  };
}

const times = (name: string, count: number) => (count === 1 ? name : `${name} × ${count}`);

/** Volume between two rounds at which the loop counts as closed, in shares of the net volume. */
const CLOSED = 1e-9;
const ROUNDS = 60;

/**
 * Closes the loop between vent length and volume: a longer vent takes up air, and less air wants a
 * shorter or longer vent. Net volume and the first tube of one vent are put right in turns until
 * both stand.
 *
 * @param tuning_hz - null leaves the vent as it is and only sets the net volume from the ledger
 * @returns the design with its net volume (and tube) set
 * @throws InputError where the inside is not given, nothing is left, or the tuning is out of reach
 */
export function netFromGross(
  design: Design,
  ventIndex: number,
  tuning_hz: number | null,
  options: LedgerOptions = {},
): Design {
  let current = design;
  for (let round = 0; round < ROUNDS; round++) {
    const ledger = ledgerOf(current, options);
    if (!ledger)
      throw new InputError(
        "inside_not_given",
        "design.enclosure.inside_m",
        "The ledger starts from the inside dimensions, and they are not given.",
      );
    if (ledger.net_volume_m3 <= 0)
      throw new InputError(
        "no_volume_left",
        "design.enclosure.inside_m",
        "Driver, vents and braces take up all of the inside.",
      );
    const before = current.enclosure.net_volume_m3;
    current = {
      ...current,
      enclosure: { ...current.enclosure, net_volume_m3: ledger.net_volume_m3 },
    };
    if (Math.abs(ledger.net_volume_m3 / before - 1) < CLOSED && round > 0) return current;
    if (tuning_hz === null) return current;
    const { tube_length_m } = lengthForTuning(current, ventIndex, tuning_hz, {
      vent_losses: options.vent_losses ?? true,
    });
    current = {
      ...current,
      vents: current.vents.map((vent, i) =>
        i === ventIndex ? withTube(vent, tube_length_m) : vent,
      ),
    };
  }
  throw new InputError(
    "ledger_does_not_close",
    "design.enclosure.inside_m",
    "Vent length and volume do not settle: the vent takes up too much of the inside.",
  );
}

/** The vent with its first tube of a length. */
function withTube(vent: Vent, length_m: number): Vent {
  if ("lumped" in vent) return vent;
  const at = vent.pieces.findIndex((piece) => piece.kind === "tube");
  return {
    ...vent,
    pieces: vent.pieces.map((piece, i) =>
      i === at && piece.kind === "tube" ? { ...piece, length_m } : piece,
    ),
  };
}
