const BROWSERS: readonly (readonly [RegExp, string])[] = [
  [/Edg\//, "Edge"], [/OPR\//, "Opera"], [/SamsungBrowser\//, "Samsung Internet"], [/Firefox\/|FxiOS\//, "Firefox"], [/Chrome\/|CriOS\//, "Chrome"], [/Safari\//, "Safari"],
];
const SYSTEMS: readonly (readonly [RegExp, string])[] = [
  [/Android/, "Android"], [/iPhone|iPad/, "iOS"], [/Windows/, "Windows"], [/Mac OS X/, "macOS"], [/CrOS/, "ChromeOS"], [/Linux/, "Linux"],
];

const first = (table: readonly (readonly [RegExp, string])[], text: string) => table.find(([pattern]) => pattern.test(text))?.[1];

/** "Firefox on Android" from a user agent; what cannot be told is said so. */
export function browserName(userAgent: string): string {
  return `${first(BROWSERS, userAgent) ?? "Unknown browser"} on ${first(SYSTEMS, userAgent) ?? "an unknown system"}`;
}
