import Link from "next/link";
import type { ComponentProps } from "react";

export type ButtonTone = "main" | "plain" | "stop";
/** touch: 44 px high; glove: 96 px high, for everything pressed during a check. */
export type ButtonSize = "touch" | "glove";

interface Looks { readonly tone?: ButtonTone; readonly size?: ButtonSize }

function looks({ tone = "plain", size = "touch" }: Looks, className = ""): string {
  const height = size === "glove" ? "min-h-glove text-xl" : "min-h-touch";
  return `tag-cut button button-${tone} ${height} ${className}`;
}

type ButtonProps = ComponentProps<"button"> & Looks & {
  /** Work is under way: the button keeps its focus, says so, and does not fire again. */
  readonly busy?: boolean;
  readonly busyLabel?: string;
};

/** A button. `type` is "button" unless given, so that it never submits a form by accident. */
export function Button({ tone, size, busy = false, busyLabel = "Working …", className, children, type = "button", onClick, ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={busy ? "button" : type}
      onClick={busy ? undefined : onClick}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      className={looks({ tone, size }, className)}
    >
      {busy ? busyLabel : children}
    </button>
  );
}

type ButtonLinkProps = ComponentProps<typeof Link> & Looks;

/** A link that looks like a button: it goes somewhere, it changes nothing. */
export function ButtonLink({ tone, size, className, ...rest }: ButtonLinkProps) {
  return <Link {...rest} className={looks({ tone, size }, className)} />;
}
