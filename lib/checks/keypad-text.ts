/** Keys of the check's own keypad; digits and the point are the characters themselves. */
export type KeypadKey = "0" | "1" | "2" | "3" | "4" | "5" | "6" | "7" | "8" | "9" | "." | "sign" | "back" | "clear" | "OL" | "none";

/** Same length as a typed reading may have on the server. */
const MAX_LENGTH = 24;
const isWord = (text: string): boolean => text === "OL" || text === "none";

/**
 * The text in the field after a key. A word stands alone: a digit after it starts afresh, "back" takes it away whole.
 * A second decimal sign is not taken.
 */
export function pressKey(text: string, key: KeypadKey): string {
  switch (key) {
    case "OL": case "none": return key;
    case "clear": return "";
    case "back": return isWord(text) ? "" : text.slice(0, -1);
    case "sign": {
      if (isWord(text)) return text;
      return /^[-\u2212]/.test(text) ? text.slice(1) : `-${text}`;
    }
    default: {
      const before = isWord(text) ? "" : text;
      if (before.length >= MAX_LENGTH || (key === "." && /[.,]/.test(before))) return before;
      return before + key;
    }
  }
}
