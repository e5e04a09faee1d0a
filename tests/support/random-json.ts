/** Random request bodies from a row of numbers: JSON of every shape, and texts that are no JSON. */
const STRINGS = [
  "", " ", "none", "OL", "1", "-1", "running", "finished", "0x10", "' OR 1=1 --", "\u0000", "\u202e", "\ud800", "café", "__proto__", "constructor",
  "01J00000000000000000000000", "2026-02-30", "2026-03-01T00:00:00Z", "../../etc/passwd", "<script>alert(1)</script>", "res:device:1-2@rest", "potentiometer", "🔌".repeat(50),
] as const;
const NUMBERS = [0, -0, 1, 2, 3, -1, 0.5, 1e21, -1e-9, 4096, 2 ** 53, 1e308] as const;
const KEYS = [
  "id", "setup", "steps", "readings", "pins", "expect", "check", "value", "type", "at", "standing", "machineId", "cavityLabels", "kind", "q", "startedAt", "reason",
  "__proto__", "constructor", "prototype", "toString", "hasOwnProperty", "length", "0", "",
] as const;

/** Bodies that no JSON parser takes, or that are larger than a request may be. */
const MALFORMED = ["", "{", "[1,", "nul", "{\"id\":}", "{'id':1}", "\u0000", "NaN", "undefined", "<xml/>", "{\"a\":1}{\"b\":2}", "[".repeat(50_000), "{\"a\":".repeat(20_000), "\"" + "x".repeat(300_000) + "\""] as const;

export type Draw = () => number;

export const pick = <T>(draw: Draw, list: readonly T[]): T => {
  const chosen = list[Math.floor(draw() * list.length)];
  if (chosen === undefined) throw new Error("nothing to pick from");
  return chosen;
};

function object(draw: Draw, depth: number): Record<string, unknown> {
  const made: Record<string, unknown> = {};
  for (let left = Math.floor(draw() * 5); left > 0; left -= 1) {
    // defineProperty: assignment to "__proto__" would set the prototype and write no key.
    Object.defineProperty(made, pick(draw, KEYS), { value: randomJson(draw, depth - 1), enumerable: true, configurable: true, writable: true });
  }
  return made;
}

/** Any JSON value, nested at most `depth` levels. */
export function randomJson(draw: Draw, depth = 4): unknown {
  const shape = draw();
  if (depth === 0 || shape < 0.35) return pick<unknown>(draw, [null, true, false, pick(draw, NUMBERS), pick(draw, STRINGS), draw() * 1e6 - 5e5]);
  if (shape < 0.6) return Array.from({ length: Math.floor(draw() * 5) }, () => randomJson(draw, depth - 1));
  return object(draw, depth);
}

/** A value that no field of any schema takes: a number out of all bounds, a list of lists, a text without end, a prototype. */
function impossible(draw: Draw): unknown {
  return pick<unknown>(draw, [-1e300, [[[]]], "x".repeat(5000), { constructor: { prototype: {} } }, JSON.parse('{"__proto__":{"admin":true}}'), [null], { length: -1 }]);
}

/** A copy of a sound body with one field, somewhere, made impossible, or with one more field than there may be. */
function spoilt(draw: Draw, value: unknown): unknown {
  if (typeof value !== "object" || value === null) return impossible(draw);
  const keys = Object.keys(value);
  if (keys.length === 0 || draw() < 0.15) return Array.isArray(value) ? impossible(draw) : { ...value, [pick(draw, ["extra", "admin", "personId"])]: 1 };
  const key = pick(draw, keys);
  const inner = spoilt(draw, (value as Record<string, unknown>)[key]);
  return Array.isArray(value) ? value.map((item, index) => (String(index) === key ? inner : item)) : { ...value, [key]: inner };
}

/** The text of one request's body: malformed, random, or a sound one that was spoilt. */
export function randomBody(draw: Draw, sound: readonly unknown[]): string {
  const shape = draw();
  if (shape < 0.1) return pick(draw, MALFORMED);
  if (shape < 0.55 || sound.length === 0) return JSON.stringify(randomJson(draw)) ?? "";
  return JSON.stringify(spoilt(draw, pick(draw, sound)));
}

/** The query of one request, with keys that the routes know and values that they need not. */
export function randomQuery(draw: Draw): string {
  const parts = Array.from({ length: Math.floor(draw() * 4) }, () => [pick(draw, [...KEYS, "machine", "person", "from", "to", "after", "limit", "state", "finding", "page"]), pick(draw, STRINGS)]);
  return new URLSearchParams(parts.map(([key, value]) => [key ?? "", value ?? ""])).toString();
}
