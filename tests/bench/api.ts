import type { Client, TestApp } from "../support/test-app.ts";
import { quantile, timingsTogether } from "./statistics.ts";

interface Read {
  name: string;
  work(): Promise<unknown>;
}

async function expectOk(answer: Promise<{ status: number }>): Promise<void> {
  const { status } = await answer;
  if (status >= 300) throw new Error(`a measured request answered ${status}`);
}

/** Latency of the main reads and of working out a plan, alone and with twenty people at once. */
export async function apiFigures(app: TestApp): Promise<Record<string, number>> {
  const adviser: Client = await app.signIn("ines.calloway@twotides.example");
  const manager: Client = await app.signIn("brigid.farthing@twotides.example");
  const buildings = (await adviser.get("/api/buildings")).body.items as {
    id: string;
    plan: { id: string } | null;
  }[];
  const building = buildings.find((entry) => entry.plan !== null);
  const me = (await manager.get("/api/me")).body;
  if (building?.plan == null) throw new Error("the demonstration has no plan");
  const planId = building.plan.id;
  const reads: Read[] = [
    { name: "me", work: () => expectOk(adviser.get("/api/me")) },
    { name: "buildings", work: () => expectOk(adviser.get("/api/buildings")) },
    { name: "survey", work: () => expectOk(adviser.get(`/api/buildings/${building.id}/survey`)) },
    { name: "plan", work: () => expectOk(adviser.get(`/api/plans/${planId}`)) },
    { name: "sites", work: () => expectOk(manager.get(`/api/cooperatives/${me.activeCooperativeId}/sites`)) },
  ];
  const figures: Record<string, number> = {};
  const measure = async (name: string, work: () => Promise<unknown>, runs: number) => {
    await work();
    for (const people of [1, 20]) {
      const times = await timingsTogether(runs, people, work);
      figures[`api.${name}.p50Ms${people}`] = quantile(times, 0.5);
      figures[`api.${name}.p95Ms${people}`] = quantile(times, 0.95);
    }
  };
  for (const { name, work } of reads) await measure(name, work, 100);
  await measure("createPlan", () => expectOk(adviser.post(`/api/buildings/${building.id}/plans`, {})), 40);
  return figures;
}
