import { Plan } from "../../server/models/plan.ts";
import { startProduct } from "../support/running-product.ts";
import { apiFigures } from "./api.ts";
import { clientFigures } from "./client.ts";
import { engineFigures } from "./engine.ts";

const app = await startProduct("bench");
try {
  const plans = await Plan.findAll({ order: [["createdAt", "ASC"]] });
  const figures = {
    ...(await engineFigures(plans.map((plan) => plan.engineInput))),
    ...(await apiFigures(app)),
    ...(await clientFigures(app.url)),
  };
  const rounded = Object.fromEntries(
    Object.entries(figures).map(([key, value]) => [key, Number(value.toPrecision(4))]),
  );
  const output = process.argv.includes("--json")
    ? JSON.stringify(rounded, null, 2)
    : Object.entries(rounded)
        .map(([key, value]) => `${key.padEnd(34)} ${value}`)
        .join("\n");
  process.stdout.write(`${output}\n`);
} finally {
  await app.close();
}
