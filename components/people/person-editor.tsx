"use client";

import { useActionState } from "react";
import { Button, Checkbox, Refusal } from "@/components/ui";
import type { FormAction } from "@/lib/action";
import type { ListedPerson } from "@/lib/people/list-people";
import { RoleWords } from "./role-words";

interface PersonEditorProps {
  readonly person: ListedPerson;
  readonly roles: readonly string[];
  readonly setRoles: FormAction;
  readonly setDisabled: FormAction;
}

/** One person, with their roles to tick and the account to shut or open. Changes count from their next request. */
export function PersonEditor({ person, roles, setRoles, setDisabled }: PersonEditorProps) {
  const [changed, sendRoles, busyRoles] = useActionState(setRoles, null);
  const [shut, sendShut, busyShut] = useActionState(setDisabled, null);
  const failed = [changed, shut].find((answer) => answer && !answer.ok);
  return (
    <li className="border-b border-quiet py-3 first:border-t">
      <RoleWords person={person} />
      <Refusal result={failed} />
      <details>
        <summary className="link flex min-h-touch w-fit cursor-pointer items-center font-bold">Change<span className="sr-only"> {person.name}</span></summary>
        <form action={sendRoles} key={person.roles.join()}>
          <input type="hidden" name="personId" value={person.id} />
          <fieldset className="flex flex-wrap gap-x-6">
            <legend className="sr-only">Roles of {person.name}</legend>
            {roles.map((role) => <Checkbox key={role} name="roles" value={role} label={role} defaultChecked={person.roles.some((own) => own === role)} />)}
          </fieldset>
          <Button type="submit" tone="main" className="mt-2" busy={busyRoles}>Save roles<span className="sr-only"> of {person.name}</span></Button>
        </form>
        <form action={sendShut} className="mt-3 mb-2">
          <input type="hidden" name="personId" value={person.id} />
          <input type="hidden" name="disabled" value={person.disabled ? "no" : "yes"} />
          <Button type="submit" tone={person.disabled ? "plain" : "stop"} busy={busyShut}>
            {person.disabled ? "Open the account" : "Disable the account"}<span className="sr-only"> of {person.name}</span>
          </Button>
        </form>
      </details>
      {changed?.ok ? <p role="status" className="font-bold text-sound">■ Roles saved</p> : null}
    </li>
  );
}
