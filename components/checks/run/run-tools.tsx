import { Button } from "@/components/ui";

export type ToolName = "drawing" | "skip" | "proposed" | "another" | "undo" | "history" | "stop";

const FACES: Readonly<Record<ToolName, string>> = {
  drawing: "Show drawing", skip: "Can\u2019t do this one", proposed: "Back to the proposed one", another: "Another reading", undo: "Undo", history: "Readings so far", stop: "Stop here",
};

interface RunToolsProps {
  readonly tools: readonly ToolName[];
  readonly canUndo: boolean;
  readonly onTool: (tool: ToolName) => void;
}

/** The other things that can be done on a screen of the check, each 96 px high. On a wide screen the drawing needs no button. */
export function RunTools({ tools, canUndo, onTool }: RunToolsProps) {
  return (
    <div role="group" aria-label="Also" className="flex flex-wrap gap-2">
      {tools.map((tool) => (
        <Button
          key={tool} size="glove" aria-disabled={tool === "undo" && !canUndo ? true : undefined}
          onClick={() => { if (tool !== "undo" || canUndo) onTool(tool); }}
          className={`min-w-0 flex-[1_1_30%] px-2 text-lg! leading-tight ${tool === "drawing" ? "lg:hidden" : ""}`}
        >
          {FACES[tool]}
        </Button>
      ))}
    </div>
  );
}
