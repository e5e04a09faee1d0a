import { beforeEach, describe, expect, it } from "vitest";
import { write } from "@/db/client";
import { checks } from "@/db/schema";
import type { Person } from "@/lib/auth/permissions";
import { getMachine } from "@/lib/machines/get-machine";
import { listMachineChecks } from "@/lib/machines/list-machine-checks";
import { listMachines } from "@/lib/machines/list-machines";
import { listMeters } from "@/lib/machines/list-meters";
import { DEFAULT_METER } from "@/lib/diagnosis";
import { seedMachines } from "@/seed/machines";
import { SEED_MACHINES } from "@/seed/machines/machines";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";

eachTestOwnDatabase();

let person: Person;
const dredger = SEED_MACHINES[0]?.id ?? "";

beforeEach(async () => {
  person = await makePerson(["technician"], "Tess Ter");
  await write(seedMachines);
});

describe("machines", () => {
  it("lists twelve by fleet number and finds them by any of their words", async () => {
    const all = await listMachines(person, {});
    expect(all.length).toBe(12);
    expect(all.map((machine) => machine.fleetNumber)).toEqual(all.map((machine) => machine.fleetNumber).sort());
    for (const q of ["d01", "D-01", "patience", "bucket dredger marlpit"]) expect((await listMachines(person, { q })).map((machine) => machine.id)).toEqual([dredger]);
    expect(await listMachines(person, { q: "zeppelin" })).toEqual([]);
  });

  it("gives one machine, and answers unknown and malformed ids by code", async () => {
    expect(await getMachine(person, { id: dredger })).toMatchObject({ fleetNumber: "D-01", batteryVolts: 24 });
    await expect(getMachine(person, { id: "01J0MACH000000000000000099" })).rejects.toMatchObject({ code: "not-found", status: 404 });
    await expect(getMachine(person, { id: "../x" })).rejects.toMatchObject({ code: "invalid-input", status: 400 });
  });

  it("lists the newest checks of one machine, abandoned ones left out", async () => {
    const row = (number: number, state: "running" | "finished" | "abandoned", machineId: string | null) => ({
      id: `CHECK${number}`, personId: person.id, machineId, state, setup: { cavityLabels: ["1", "2", "3"] as const }, startedAt: new Date(2026, 9, number),
    });
    await write((db) => db.insert(checks).values([row(1, "finished", dredger), row(2, "abandoned", dredger), row(3, "running", dredger), row(4, "finished", null)]));
    const history = await listMachineChecks(person, { id: dredger });
    expect(history.total).toBe(2);
    expect(history.newest.map((check) => [check.id, check.finished, check.person])).toEqual([["CHECK3", false, "Tess Ter"], ["CHECK1", true, "Tess Ter"]]);
    expect((await listMachineChecks(person, { id: dredger, limit: 1 })).newest.length).toBe(1);
  });

  it("lists three meters, the bench meter first", async () => {
    const meters = await listMeters(person);
    expect(meters.length).toBe(3);
    expect(meters[0]?.spec).toEqual(DEFAULT_METER);
  });
});
