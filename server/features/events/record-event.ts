import type { Transaction } from "sequelize";
import { FarmEvent } from "../../models/farm-event.ts";

interface EventNote {
  farmId: string;
  buildingId?: string;
  personId: string | null;
  action: string;
  detail?: Record<string, unknown>;
}

/** Writes down who did what, in the transaction of the change itself. */
export async function recordEvent(note: EventNote, transaction: Transaction): Promise<void> {
  await FarmEvent.create(
    { ...note, buildingId: note.buildingId ?? null, detail: note.detail ?? {} },
    { transaction },
  );
}
