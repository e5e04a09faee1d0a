/** The form an action was called with. Anyone can call an action with anything: what is no form holds no fields. */
export function formOf(given: unknown): FormData {
  return given instanceof FormData ? given : new FormData();
}
