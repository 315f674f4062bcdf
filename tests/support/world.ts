import type { Cooperative } from "../../server/models/cooperative.ts";
import { buildCooperative, buildFarm, buildPerson, emailOf, tunnelBody } from "./factories.ts";
import type { Client, TestApp } from "./test-app.ts";

export interface World {
  cooperative: Cooperative;
  farmId: string;
  buildingId: string;
  advisor: Client;
  farmer: Client;
  manager: Client;
  /** A full set of roles in another co-operative. */
  stranger: Client;
  visitor: Client;
}

/** One co-operative with a farm and a pinned tunnel, its people signed in, and a stranger from another co-operative. */
export async function buildWorld(app: TestApp): Promise<World> {
  const cooperative = await buildCooperative();
  const advisor = await buildPerson("ines", cooperative, ["advisor"]);
  const farmer = await buildPerson("fionn", cooperative, ["farmer"]);
  await buildPerson("brigid", cooperative, ["manager"]);
  const elsewhere = await buildCooperative("Another Co-operative");
  const stranger = await buildPerson("moana", elsewhere, ["advisor", "manager", "farmer"]);
  await buildFarm({ cooperative: elsewhere, advisor: stranger, farmer: stranger, name: "Far away" });
  const farm = await buildFarm({ cooperative, advisor, farmer });
  const clients = {
    advisor: await app.signIn(emailOf("ines")),
    farmer: await app.signIn(emailOf("fionn")),
    manager: await app.signIn(emailOf("brigid")),
    stranger: await app.signIn(emailOf("moana")),
    visitor: app.visitor(),
  };
  const pinned = await clients.advisor.post(`/api/farms/${farm.id}/buildings`, tunnelBody);
  return { cooperative, farmId: farm.id, buildingId: pinned.body.id, ...clients };
}
