import { seedDemo } from "../../server/database/demo/seed.ts";
import { startTestApp, type TestApp } from "./test-app.ts";

/** The whole product with its demonstration, on a database of its own, serving the built pages. */
export async function startProduct(name: string): Promise<TestApp> {
  const app = await startTestApp(name);
  await seedDemo(app.sequelize);
  return app;
}
