import { ofVent, statusOf, told, type Check } from "../margin";

/** Share of the limit that counts as near. */
const NEAR = 0.06;
/** The bookwork's usual share of the speed of sound, given as such and not as a fact of hearing. */
const BOOKWORK_SHARE = 0.05;

export const airSpeed: Check = (subject) => {
  const { answer, design } = subject;
  const own = design.target.air_speed_limit_m_s;
  const bookwork = BOOKWORK_SHARE * answer.air.speed_of_sound_m_s;
  const limit = own ?? bookwork;
  const share = ((100 * limit) / answer.air.speed_of_sound_m_s).toFixed(1);
  const source = own === null ? "5 % of c, bookwork" : `your limit, ${share} % of c`;
  return answer.vents.flatMap((vent, index) => {
    const peak = vent.peak_air_speed;
    if (!peak) return [];
    const left = limit - peak.speed_m_s;
    const at = told(subject, peak.frequency_hz, "frequency", { digits: 0 });
    return [
      {
        id: `air-speed-${index}`,
        title: `Air speed${ofVent(design, index)}`,
        status: statusOf(left, NEAR * limit),
        value: told(subject, peak.speed_m_s, "speed"),
        limit: told(subject, limit, "speed"),
        left: told(subject, left, "speed", { signed: true }),
        reason: `${told(subject, peak.speed_m_s, "speed")} peak at ${at} and ${told(subject, design.drive.voltage_v, "voltage")}, mean over the bore; held against ${told(subject, limit, "speed")} (${source}).`,
      },
    ];
  });
};
