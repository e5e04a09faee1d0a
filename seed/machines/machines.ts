interface SeedMachine {
  readonly id: string;
  readonly fleetNumber: string;
  readonly name: string;
  readonly type: string;
  readonly site: string;
  readonly batteryVolts: number;
  readonly note: string;
}

/** Ids never change, so that demo checks can name their machine. */
const id = (number: number) => `01J0MACH${String(number).padStart(18, "0")}`;

/** The plant of an invented canal trust: three sites, twelve machines. */
export const SEED_MACHINES: readonly SeedMachine[] = [
  { id: id(1), fleetNumber: "D-01", name: "Patience", type: "Bucket-ladder dredger", site: "Marlpit Basin", batteryVolts: 24, note: "Ladder and spuds on one controller. Parting plug X4 takes both angle sensors out." },
  { id: id(2), fleetNumber: "D-02", name: "Heron", type: "Grab dredger", site: "Marlpit Basin", batteryVolts: 24, note: "Excavator on a pontoon; slewing lock is behind the seat." },
  { id: id(3), fleetNumber: "W-11", name: "Reedling", type: "Weed-cutting boat", site: "Ashen Lock Depot", batteryVolts: 12, note: "Cutter boom drops slowly with the engine off." },
  { id: id(4), fleetNumber: "W-12", name: "Coot", type: "Weed-cutting boat", site: "Ashen Lock Depot", batteryVolts: 12, note: "" },
  { id: id(5), fleetNumber: "W-14", name: "Sedge", type: "Weed-harvesting boat", site: "Tannery Reach", batteryVolts: 24, note: "Two conveyors, height sensor on the rear one only." },
  { id: id(6), fleetNumber: "L-31", name: "Ashen Lock, top paddles", type: "Lock-paddle actuator", site: "Ashen Lock Depot", batteryVolts: 24, note: "Isolator in the green cabinet, key with the lock keeper." },
  { id: id(7), fleetNumber: "L-32", name: "Ashen Lock, bottom paddles", type: "Lock-paddle actuator", site: "Ashen Lock Depot", batteryVolts: 24, note: "" },
  { id: id(8), fleetNumber: "L-40", name: "Tannery swing bridge", type: "Swing bridge", site: "Tannery Reach", batteryVolts: 24, note: "Road barriers must be down before power goes on." },
  { id: id(9), fleetNumber: "T-05", name: "Tractor with bank mower", type: "Tractor", site: "Marlpit Basin", batteryVolts: 12, note: "Front and rear hitch; mower head has its own controller." },
  { id: id(10), fleetNumber: "T-07", name: "Tractor with winch", type: "Tractor", site: "Tannery Reach", batteryVolts: 12, note: "" },
  { id: id(11), fleetNumber: "H-02", name: "Slipway winch", type: "Winch", site: "Marlpit Basin", batteryVolts: 24, note: "Line-pull pin replaced in spring 2024." },
  { id: id(12), fleetNumber: "B-09", name: "Dabchick", type: "Winch tug", site: "Tannery Reach", batteryVolts: 24, note: "" },
];
