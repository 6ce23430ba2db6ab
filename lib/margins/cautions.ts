/** Cautions, each for the step at which it bites. They defer to makers, local rules and licensed practice. */
export interface Caution {
  id: string;
  text: string;
}

/** 85 dB(A) over 8 h with 3 dB exchange is the occupational limit recommended by NIOSH (dossier of the trade, 5.8). */
export const hearingCaution: Caution = {
  id: "hearing",
  text: "Loud enough to hurt hearing: the occupational limit is 85 dB(A) over 8 hours, half the time for each 3 dB more, and it is not a safe level for leisure. Low bass reads low on A-weighting. Protect your ears in sine sweeps.",
};

export const cuttingCaution: Caution = {
  id: "cutting",
  text: "Unplug to change bits; take large bits slowly and in a table; never hold a small ring by hand; hold the disc before the last pass frees it. Eyes, ears, dust mask and extraction. The machine's and the bit maker's instructions come first.",
};

export const electricalCaution: Caution = {
  id: "electrical",
  text: "Amplifiers by their maker's instructions; mains and vehicle wiring by licensed practice and local rules.",
};

/** Level from which the hearing caution stands [dB]. */
export const LOUD_DB = 85;
