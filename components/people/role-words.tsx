import type { ListedPerson } from "@/lib/people/list-people";

/** Name, address, roles and whether the account is shut, in words. */
export function RoleWords({ person }: { readonly person: ListedPerson }) {
  return (
    <>
      <p className="text-lg font-bold">{person.name}{person.disabled ? <span className="text-stop"> ■ disabled</span> : null}</p>
      <p className="text-quiet">{person.email} · {person.roles.join(", ")}</p>
    </>
  );
}
