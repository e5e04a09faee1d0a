"use client";

import { useEffect, useRef, type KeyboardEvent } from "react";

/** A key typed where text goes in belongs to that field. */
function isTyping(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));
}

/**
 * Keys of a search: "/" goes to the field, arrow down from the field to the first result, arrows up and down through the
 * results, up from the first one and Escape back to the field. Enter follows the link, as everywhere; in the field the
 * form's owner sends it to the first result, which also puts a phone's keyboard away.
 */
export function useResultKeys() {
  const field = useRef<HTMLInputElement>(null);
  const list = useRef<HTMLOListElement>(null);

  useEffect(() => {
    const onKey = (event: globalThis.KeyboardEvent) => {
      if (event.key !== "/" || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      event.preventDefault();
      field.current?.focus();
      field.current?.select();
    };
    document.addEventListener("keydown", onKey);
    return () => document.removeEventListener("keydown", onKey);
  }, []);

  const links = () => [...(list.current?.querySelectorAll<HTMLAnchorElement>("a[data-result]") ?? [])];

  const toFirst = () => links()[0]?.focus();

  const onFieldKey = (event: KeyboardEvent) => {
    if (event.key !== "ArrowDown") return;
    event.preventDefault();
    toFirst();
  };

  const onListKey = (event: KeyboardEvent) => {
    const all = links();
    const at = all.findIndex((link) => link === document.activeElement);
    if (event.key === "Escape" || (event.key === "ArrowUp" && at <= 0)) field.current?.focus();
    else if (event.key === "ArrowDown") all[Math.min(at + 1, all.length - 1)]?.focus();
    else if (event.key === "ArrowUp") all[at - 1]?.focus();
    else return;
    event.preventDefault();
  };

  return { field, list, toFirst, onFieldKey, onListKey };
}
