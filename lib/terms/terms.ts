/** Terms of the trade, each explained in a sentence or two where it stands. */
export interface Term {
  name: string;
  text: string;
}

const entries: Record<string, [name: string, text: string]> = {
  tuning: [
    "Tuning frequency f_B",
    "The note at which the air in the vent and the air in the box swing together. The vent does the work there and the cone nearly rests.",
  ],
  "air-speed": [
    "Air speed",
    "How fast the air in the vent moves at its peak, averaged over the bore, at the set drive. Too fast and it is heard.",
  ],
  fs: [
    "Resonance f_S",
    "The driver's own resonance in free air, from its data sheet or measured after running in.",
  ],
  qes: [
    "Electrical Q, Q_ES",
    "How strongly the motor damps the driver's resonance. Smaller is stronger.",
  ],
  qms: ["Mechanical Q, Q_MS", "How little the suspension itself damps the resonance."],
  vas: ["Compliance volume V_AS", "The volume of air as springy as the driver's suspension."],
  re: ["Coil resistance R_E", "Resistance of one coil at direct current, as a meter reads it."],
  sd: ["Cone area S_D", "The area that moves air: of a circle to the middle of the surround."],
  xmax: ["Travel x max", "How far the cone may move one way from rest and stay clean."],
  le: ["Coil inductance L_E", "Raises the impedance and takes off level towards high frequencies."],
  power: ["Power", "What one driver bears for long, reckoned into its coil resistance."],
  "driver-volume": [
    "Driver's own volume",
    "What magnet and basket take from the inside of the box.",
  ],
  air: [
    "Air temperature",
    "Warm air carries sound faster: the tuning rises by 0.17 % for each degree.",
  ],
  pressure: ["Air pressure", "It falls with altitude. The tuning hardly notices; the level does."],
  humidity: [
    "Relative humidity",
    "Moist air carries sound a little faster: at 20 °C, dry to wet, the tuning rises by 0.4 %.",
  ],
  "net-volume": [
    "Net volume",
    "The air that acts as the spring: driver, vents, braces and all else that is solid already taken off.",
  ],
  "inside-depth": [
    "Inside depth",
    "From the inside of the panel with the vent to the wall it faces.",
  ],
  inside: [
    "Inside dimensions",
    "Between the inner faces of the panels. They tell how the walls crowd the vent's inner end.",
  ],
  panel: [
    "Panel thickness",
    "Of the panel that carries the vent, all its layers together, as measured.",
  ],
  ql: [
    "Leakage Q_L",
    "How tight the box is. 7 is a fair start for boxes of middling size; larger is tighter.",
  ],
  qa: ["Absorption Q_A", "How little lining takes up. About 100 unlined, 30 to 80 lined."],
  drive: [
    "Drive voltage",
    "What the amplifier puts across the whole array of drivers, rms, before the filters.",
  ],
  "source-resistance": [
    "Source and leads",
    "Resistance between the amplifier's voltage and the drivers: leads, filters, the amplifier's own.",
  ],
  "voltage-limit": ["Amplifier at most", "The voltage at which the amplifier clips, rms."],
  "minimum-load": ["Amplifier bears", "The least impedance its maker allows."],
  "vent-count": [
    "Vents alike",
    "Equal vents side by side. Each must be longer than a single one of the summed area would be.",
  ],
  bore: ["Bore", "The inside diameter, as calipered. Pipe is not what its name says."],
  slot: ["Slot", "A flat vent. Its height counts most for noise, its area for tuning."],
  "shared-walls": [
    "Sides on panels",
    "How many of the slot's four sides are the box's own panels. Each makes the inner end act longer.",
  ],
  flare: [
    "Flare",
    "A quarter circle from the bore to the mouth. It counts inside the overall length, and a flared vent must be longer than a plain one.",
  ],
  proud: [
    "Proud",
    "How far the mouth stands in front of the panel's face, such as on a flange laid on it.",
  ],
  spacing: ["Between centres", "Near vents load each other and act a little longer."],
  clearance: ["Clearance", "From the inner mouth to the wall it faces. Keep one bore of free air."],
  "outer-clearance": [
    "Mouth to room wall",
    "A wall or floor near the mouth makes the vent act longer.",
  ],
  rings: ["Rings", "Rings of sheet glued to a stock tube to make it long enough."],
  tube: ["Tube", "The stock tube as it lies, its own flares included, face to face."],
  bend: ["Bend", "Counted along its centreline. It acts a little shorter than it measures."],
  "sheet-thickness": [
    "Thickness, measured",
    "What the calipers say, the mean of three readings or more. Sheet is thinner than its name.",
  ],
  "outer-diameter": [
    "Outside diameter",
    "It takes volume from the box, and a wide end acts like a flange.",
  ],
  "glue-line": ["Glue line", "What one joint adds: 0.05 to 0.15 mm with white glue."],
  "bore-step": [
    "Own bore",
    "Where a piece is wider or narrower than the vent. A millimetre hardly matters to the tuning; it is heard sooner than measured.",
  ],
  "infrasonic-filter": [
    "Infrasonic filter",
    "A high-pass below the tuning. There the cone moves freely and makes little sound.",
  ],
  "low-pass": [
    "Low-pass",
    "Where the driver hands over upwards. Keep the vent's own pipe resonance well above it.",
  ],
  "end-correction": [
    "End correction",
    "The air beyond each mouth that swings along. It makes the vent act longer than it is.",
  ],
  excursion: ["Excursion", "How far the cone moves from rest, at its peak."],
  impedance: [
    "Impedance",
    "What the amplifier sees. Two peaks with a dip between them, near the tuning.",
  ],
  "group-delay": ["Group delay", "How much later a note's swell comes out than it went in."],
  plate: ["Support plate", "A wide ring at the inner end that carries a long vent."],
  "pipe-resonance": ["Pipe resonance", "The vent sounding like an organ pipe, half a wave long."],
};

export const terms: Record<string, Term | undefined> = Object.fromEntries(
  Object.entries(entries).map(([key, [name, text]]) => [key, { name, text }]),
);
