import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { connectorShape, CONNECTOR_SHAPES } from "@/lib/catalogue/connector-shapes";
import { ConnectorFace } from "./connector-face";
import { faceBox, FLAG, HOLE, leadLanes, placeCavities } from "./face-geometry";

function shape(id: string) {
  const found = connectorShape(id);
  if (!found) throw new Error(id);
  return found;
}

const pairs = CONNECTOR_SHAPES.flatMap((face) => face.cavities.flatMap((a) => face.cavities.filter((b) => b !== a).map((b) => [face.id, a.label, b.label] as const)));

describe("leads on a face", () => {
  it.each(pairs)("%s: red on %s and black on %s cross no other cavity and keep their flags apart", (id, red, black) => {
    const face = shape(id);
    const placed = placeCavities(face);
    const lanes = leadLanes(face, placed, faceBox(face, placed), { red, black });
    if (!lanes.red || !lanes.black) throw new Error("both leads are drawn");
    for (const [lane, label] of [[lanes.red, red], [lanes.black, black]] as const) {
      for (const other of placed) {
        if (other.label === label) continue;
        const inside = (at: number, a: number, b: number) => at > Math.min(a, b) - HOLE && at < Math.max(a, b) + HOLE;
        const crossed = lane.from.x === lane.to.x
          ? Math.abs(other.x - lane.to.x) < HOLE && inside(other.y, lane.from.y, lane.to.y)
          : Math.abs(other.y - lane.to.y) < HOLE && inside(other.x, lane.from.x, lane.to.x);
        expect(crossed).toBe(false);
      }
    }
    const apart = lanes.red.side !== lanes.black.side || Math.abs(lanes.red.from.x - lanes.black.from.x) >= FLAG.width || Math.abs(lanes.red.from.y - lanes.black.from.y) >= FLAG.height;
    expect(apart).toBe(true);
  });
});

describe("face as markup", () => {
  it("names shape, gender, side, pins and leads in words", () => {
    const html = renderToStaticMarkup(
      <ConnectorFace
        shape={shape("round-3-of-4-plug")} leads={{ red: "2", blackAway: "battery negative" }}
        pins={[{ cavity: "1", role: "supply" }, { cavity: "2", role: "ground" }, { cavity: "3", role: "signal" }]}
      />,
    );
    expect(html).toContain("Round, three of four, plug, seen from the mating side</title>");
    expect(html).toContain("Cavities 1 +V, 2 0V, 3 SIG, 4 unused. No latch. Red lead on cavity 2. Black lead on battery negative.</desc>");
    for (const text of [">+V<", ">0V<", ">SIG<", ">R<", ">B<", "Seen from the mating side;"]) expect(html).toContain(text);
  });

  it("draws no lead on a cavity that is not there, and takes a name from outside", () => {
    const html = renderToStaticMarkup(<ConnectorFace shape={shape("inline-3-plug")} leads={{ red: "9" }} labelledBy="lead-card" />);
    expect(html).toContain('aria-labelledby="lead-card"');
    expect(html).not.toContain(">R<");
  });

  it("is hardly wider than a phone at natural size, so that its text stays 16 px", () => {
    for (const face of CONNECTOR_SHAPES) {
      const width = Number(/width="([\d.]+)"/.exec(renderToStaticMarkup(<ConnectorFace shape={face} />))?.[1]);
      expect(width).toBeGreaterThan(100);
      expect(width).toBeLessThanOrEqual(380);
    }
  });
});
