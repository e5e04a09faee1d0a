import type { UseFormRegisterReturn } from "react-hook-form";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import { FaceSvg } from "./mini-face";

interface ShapePickerProps {
  readonly shapes: readonly ConnectorShape[];
  readonly field: UseFormRegisterReturn;
}

const TILE = "flex min-h-24 cursor-pointer flex-col items-center justify-center gap-1 border-2 border-quiet bg-sheet p-1.5 text-center leading-tight has-checked:border-4 has-checked:border-bench has-checked:font-bold has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-bench hover:bg-(--hover)";

/** Picks the connector by its drawing: native radio buttons, so that arrow keys and screen readers work as they do everywhere. */
export function ShapePicker({ shapes, field }: ShapePickerProps) {
  return (
    <fieldset>
      <legend className="text-lg font-bold">Connector</legend>
      <p className="mb-2 text-quiet">The harness half with its sockets, seen from the mating side.</p>
      <div className="grid grid-cols-3 gap-2 sm:grid-cols-4 lg:grid-cols-5">
        <label className={TILE}>
          <input {...field} type="radio" value="" className="sr-only" />
          Another, or not seen
        </label>
        {shapes.map((shape) => {
          const [a, b, c] = shape.cavities.map((cavity) => cavity.label);
          return (
            <label key={shape.id} className={TILE}>
              <input {...field} type="radio" value={shape.id} className="sr-only" />
              <span aria-hidden="true" className="max-w-28"><FaceSvg shape={shape} labels={[a ?? "", b ?? "", c ?? ""]} title={shape.name} plain /></span>
              {shape.name}
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
