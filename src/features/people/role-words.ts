import type { Role } from "../../../server/contracts/people.ts";

export const roleWords: Record<Role, string> = { advisor: "Adviser", farmer: "Farmer", manager: "Manager" };

export const roleOptions: { value: Role; label: string }[] = [
  { value: "advisor", label: roleWords.advisor },
  { value: "farmer", label: roleWords.farmer },
  { value: "manager", label: roleWords.manager },
];
