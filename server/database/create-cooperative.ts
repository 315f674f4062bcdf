import { parseArgs } from "node:util";
import { z } from "zod";
import { readConfig } from "../config.ts";
import { nameSchema } from "../contracts/common.ts";
import { findOrInvite } from "../features/people/find-or-invite.ts";
import { bindModels } from "../models/associations.ts";
import { Cooperative } from "../models/cooperative.ts";
import { connect } from "./connection.ts";
import { migrateUp } from "./migrate.ts";
import { seedReferenceData } from "./seeds/index.ts";

/** Starts an empty co-operative with its first manager, who then invites everybody else. */
const argumentsSchema = z.object({
  name: nameSchema("--name"),
  country: z
    .string("--country is missing.")
    .regex(/^[A-Z]{2}$/, "--country must be two capital letters, such as FR."),
  "manager-name": nameSchema("--manager-name"),
  "manager-email": z.email("--manager-email must be a full e-mail address."),
});

function readArguments(): z.infer<typeof argumentsSchema> {
  const option = { type: "string" } as const;
  const { values } = parseArgs({
    options: { name: option, country: option, "manager-name": option, "manager-email": option },
  });
  const parsed = argumentsSchema.safeParse(values);
  if (parsed.success) return parsed.data;
  const usage =
    'npm run coop:create -- --name "..." --country FR --manager-name "..." --manager-email name@example.org';
  throw new Error([...parsed.error.issues.map((issue) => issue.message), usage].join("\n"));
}

async function main(): Promise<void> {
  const given = readArguments();
  const sequelize = connect(readConfig(process.env).database);
  bindModels(sequelize);
  try {
    await migrateUp(sequelize);
    await seedReferenceData();
    await sequelize.transaction(async (transaction) => {
      const cooperative = await Cooperative.create(
        { name: given.name, country: given.country },
        { transaction },
      );
      const manager = {
        name: given["manager-name"],
        email: given["manager-email"],
        role: "manager" as const,
      };
      await findOrInvite({ ...manager, cooperativeId: cooperative.id }, transaction);
    });
    process.stdout.write(
      `${given.name} is there. ${given["manager-name"]} can sign in with ${given["manager-email"]}.\n`,
    );
  } finally {
    await sequelize.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
