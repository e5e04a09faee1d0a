import type { RunSetup } from "@/lib/checks/run";

/** What a check is called while it runs: the entry's name, or what is known of the unknown device. */
export function runName(setup: RunSetup): string {
  const device = setup.entryName ?? (setup.senses ? `Unknown device (${setup.senses})` : "Unknown device");
  return setup.machineName ? `${device}, ${setup.machineName}` : device;
}
