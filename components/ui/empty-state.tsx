import type { ReactNode } from "react";

interface EmptyStateProps {
  readonly title: ReactNode;
  /** Why it is empty and what to do. */
  readonly children?: ReactNode;
  readonly action?: ReactNode;
}

/** What stands where a list would be. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="border-l-4 border-rule py-2 pl-4">
      <p className="text-lg font-bold">{title}</p>
      {children ? <div className="mt-1 max-w-prose text-quiet">{children}</div> : null}
      {action ? <div className="mt-4 flex flex-wrap gap-3">{action}</div> : null}
    </div>
  );
}
