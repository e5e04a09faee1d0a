/** Part of a SPICE netlist: one small circuit whose names begin with its own prefix, so that many fit into one run. */
export class Circuit {
  readonly lines: string[] = [];
  private count = 0;

  constructor(readonly prefix: string) {}

  /** The simulator's name of a node; "0" is the reference of all circuits. */
  node(name: string): string {
    return name === "0" ? "0" : `${this.prefix}${name}`;
  }

  resistor(a: string, b: string, ohms: number): void {
    this.lines.push(`R${this.next()} ${this.node(a)} ${this.node(b)} ${ohms}`);
  }

  /** An ideal source; 0 V is a piece of wire. */
  source(plus: string, minus: string, volts: number): void {
    this.lines.push(`V${this.next()} ${this.node(plus)} ${this.node(minus)} ${volts}`);
  }

  /** A source behind a resistance. */
  feed(plus: string, minus: string, volts: number, ohms: number): void {
    const inside = `s${this.count}`;
    this.source(inside, minus, volts);
    this.resistor(inside, plus, ohms);
  }

  diode(anode: string, cathode: string, saturation: number, emission: number): void {
    const id = this.next();
    this.lines.push(`.model m${id} D(IS=${saturation} N=${emission})`, `D${id} ${this.node(anode)} ${this.node(cathode)} m${id}`);
  }

  /** Keeps a node that nothing may touch from floating. */
  hold(...nodes: readonly string[]): void {
    for (const n of nodes) this.resistor(n, "0", 1e12);
  }

  private next(): string {
    return `${this.prefix}_${this.count++}`;
  }
}
