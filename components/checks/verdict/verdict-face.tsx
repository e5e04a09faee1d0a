import { ConnectorFace } from "@/components/connector/connector-face";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { Labels } from "@/lib/checks/check-name";
import { roleOf } from "@/lib/checks/finding-words";
import type { Fault, PinAssignment, PinNumber } from "@/lib/diagnosis";

const PINS: readonly PinNumber[] = [1, 2, 3];

interface VerdictFaceProps {
  readonly shape: ConnectorShape;
  readonly labels: Labels;
  readonly pins: PinAssignment | null;
  readonly findings: readonly Fault[];
}

/** The connector's face with the pins' tags where these are settled, and the cavities of the open findings marked. */
export function VerdictFace({ shape, labels, pins, findings }: VerdictFaceProps) {
  const marked = new Set(findings.flatMap((fault) => fault.pins ?? []).map((pin) => labels[pin - 1] ?? ""));
  const known = PINS.map((pin) => ({ cavity: labels[pin - 1] ?? "", ...(pins ? { role: roleOf(pins, pin) } : {}) }));
  return <ConnectorFace shape={shape} pins={known} highlight={[...marked]} />;
}
