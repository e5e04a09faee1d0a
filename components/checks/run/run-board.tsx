"use client";

import { undoable } from "@/lib/checks/run-state";
import { ContradictionBanner } from "./contradiction-banner";
import { WideDrawing } from "./drawing";
import { FinishingScreen } from "./finishing-screen";
import { typeAhead } from "./reading-entry";
import { RunDialogs } from "./run-dialogs";
import { ScreenAnswer, ScreenGuide } from "./run-screen-view";
import { RunTools, type ToolName } from "./run-tools";
import { SentMark } from "./sent-mark";
import { StandingPanel } from "./standing-panel";
import { useBoard, type BoardProps } from "./use-board";

type Board = ReturnType<typeof useBoard>;

/** Tools that make sense on a screen. */
function toolsFor(spec: boolean, chosen: boolean): readonly ToolName[] {
  return [...(spec ? ["skip"] as const : []), ...(chosen ? ["proposed"] as const : []), "another", "undo", "history", "drawing", "stop"];
}

/** What to do now, with a banner above it when the readings contradict each other. */
function Guide({ board, props: { run, outbox, end } }: { readonly board: Board; readonly props: BoardProps }) {
  const { engine, screen, actions, finish } = board;
  if (board.ending) return <FinishingScreen outbox={outbox} refusal={outbox.refused.get(run.id) ?? null} onRetry={outbox.flushNow} onBack={() => void end("no")} />;
  return (
    <>
      {engine.current?.state === "contradictory" ? <ContradictionBanner assessment={engine.current} labels={run.setup.cavityLabels} onAgain={actions.choose} /> : null}
      <ScreenGuide
        screen={screen} failed={engine.failed} setup={run.setup} standing={board.standing} actions={actions}
        onVerdict={() => finish("asked")} onCarryOn={() => board.changeDraft({ carryOn: true })}
      />
    </>
  );
}

/** The running check: what to do now, where the reading goes in, and what is believed so far. */
export function RunBoard(props: BoardProps) {
  const { run, kept, outbox } = props;
  const board = useBoard(props);
  const { draft, screen, spec, actions, finish } = board;
  const active = board.ending === null;
  return (
    <div onKeyDown={typeAhead} className="mx-auto max-w-lg lg:grid lg:max-w-6xl lg:grid-cols-[minmax(0,1fr)_minmax(0,27rem)] lg:grid-rows-[auto_auto_1fr] lg:gap-x-10">
      <StandingPanel engine={board.engine} labels={run.setup.cavityLabels} why={board.why} chosen={draft.chosen !== null} />
      <div className="grid grid-cols-1 content-start gap-3 pt-2 pb-1.5 lg:col-start-1 lg:row-span-3 lg:row-start-1">
        <Guide board={board} props={props} />
        <WideDrawing facts={board.facts} />
      </div>
      <div className="grid grid-cols-1 content-start gap-4 pb-6 lg:col-start-2 lg:row-start-3 lg:pt-3">
        {screen.type === "reading" && active ? <ScreenAnswer spec={screen.spec} typed={draft.typed} onTyped={(typed) => board.changeDraft({ typed })} actions={actions} /> : null}
        {active ? <RunTools tools={toolsFor(spec !== null, draft.chosen !== null)} canUndo={undoable(run.steps) !== null} onTool={board.onTool} /> : null}
        <SentMark outbox={outbox} kept={kept} />
      </div>
      <RunDialogs open={board.tool} run={run} spec={spec} facts={board.facts} actions={actions} onClose={board.closeTool} onVerdict={() => finish("asked")} onAbandon={() => finish("abandon")} />
    </div>
  );
}
