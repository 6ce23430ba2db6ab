/** Who may do what in a shop. The interface, the data layer and the tests read this one table. */
export const roles = ["owner", "designer", "builder", "installer"] as const;
export type Role = (typeof roles)[number];

const everyone: readonly Role[] = roles;
const makers: readonly Role[] = ["owner", "designer"];

const allowed = {
  "designs.read": everyone,
  "designs.write": makers,
} as const satisfies Record<string, readonly Role[]>;

export type Action = keyof typeof allowed;
export const actions = Object.keys(allowed) as Action[];

export function may(role: Role, action: Action): boolean {
  return allowed[action].some((listed) => listed === role);
}
