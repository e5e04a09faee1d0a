import { describe, expect, it } from "vitest";
import { assess, type Reading } from "@/lib/diagnosis";
import { standingSchema, type ComparedStanding } from "./schemas";
import { standingDifference } from "./standing-difference";

const READINGS: readonly Reading[] = [["res:device:1-3@rest", 4700], ["res:device:1-2@rest", 940]];
const server = assess({ pins: ["1", "2", "3"] }, READINGS);
/** What the phone sends: the same standing through JSON. */
const sent = (): ComparedStanding => standingSchema.parse(JSON.parse(JSON.stringify(server)));

describe("the phone's standing beside the server's", () => {
  it("is the same when the same code ran on the same readings", () => {
    expect(standingDifference(server, sent())).toEqual([]);
  });

  it("differs when one number differs in its last bit", () => {
    const phone = sent();
    const first = phone.kinds[0];
    if (!first) throw new Error("no kinds");
    const next = new Float64Array([first.p]);
    new BigInt64Array(next.buffer)[0]! += 1n;
    first.p = next[0] ?? NaN;
    expect(standingDifference(server, phone)).toEqual(["kinds"]);
  });

  it("differs when a list is in another order or shorter", () => {
    const phone = sent();
    phone.faults.reverse();
    phone.pins.pop();
    expect(standingDifference(server, phone)).toEqual(["pins", "faults"]);
  });
});
