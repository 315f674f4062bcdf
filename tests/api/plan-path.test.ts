import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestApp, type TestApp } from "../support/test-app.ts";
import { buildWorld, type World } from "../support/world.ts";

describe("from survey to decision", () => {
  let app: TestApp;
  let world: World;
  let planId: string;
  beforeAll(async () => {
    app = await startTestApp("plan_path");
    world = await buildWorld(app);
  });
  afterAll(() => app.close());

  it("works a plan out and freezes survey and result", async () => {
    const answer = await world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {});
    expect(answer.status).toBe(201);
    planId = answer.body.id;
    expect(answer.body.status).toBe("draft");
    expect(answer.body.number).toBe(1);
    expect(answer.body.result.months).toHaveLength(12);
    expect(answer.body.result.sizing.onceInYearsRequiredW).toBeGreaterThan(
      answer.body.result.sizing.everydayRequiredW * 0.99,
    );
    expect(answer.body.survey.shape.length.typed).toBe("96");
  });

  it("a draft is the adviser's own", async () => {
    expect((await world.farmer.get(`/api/plans/${planId}`)).status).toBe(404);
    expect((await world.farmer.post(`/api/plans/${planId}/answer`, { answer: "approve" })).status).toBe(404);
    expect((await world.farmer.get(`/api/buildings/${world.buildingId}/plans`)).body.items).toEqual([]);
  });

  it("is sent with one of its own options, and the farmer gets a letter", async () => {
    const wrong = await world.advisor.post(`/api/plans/${planId}/send`, { optionId: "golden" });
    expect(wrong.status).toBe(422);
    const plan = (await world.advisor.get(`/api/plans/${planId}`)).body;
    const sent = await world.advisor.post(`/api/plans/${planId}/send`, {
      optionId: plan.result.sizing.options[0].id,
      message: "Have a look.",
    });
    expect(sent.status).toBe(200);
    expect(sent.body.status).toBe("sent");
    await expect.poll(() => app.mails.length).toBe(1);
    expect(app.mails[0]!.to).toEqual(["fionn.glasheen@twotides.example"]);
    expect(app.mails[0]!.raw).toContain(`/plans/${planId}`);
    expect((await world.advisor.post(`/api/plans/${planId}/send`, { optionId: "two" })).status).toBe(409);
  });

  it("a question goes to the adviser and back", async () => {
    expect(
      (await world.farmer.post(`/api/plans/${planId}/answer`, { answer: "ask", message: "" })).status,
    ).toBe(422);
    const asked = await world.farmer.post(`/api/plans/${planId}/answer`, {
      answer: "ask",
      message: "Why two?",
    });
    expect(asked.body.status).toBe("asked");
    expect((await world.advisor.get("/api/me")).body.openReviews).toBe(1);
    const reply = await world.advisor.post(`/api/plans/${planId}/messages`, { message: "One can fail." });
    expect(reply.body.status).toBe("sent");
    expect(reply.body.messages.map((message: { text: string }) => message.text)).toEqual([
      "Have a look.",
      "Why two?",
      "One can fail.",
    ]);
  });

  it("only the farmer decides, and may change it for a week", async () => {
    expect((await world.advisor.post(`/api/plans/${planId}/answer`, { answer: "approve" })).status).toBe(403);
    const approved = await world.farmer.post(`/api/plans/${planId}/answer`, { answer: "approve" });
    expect(approved.body.status).toBe("approved");
    expect(approved.body.answeredBy).toBe("Test fionn");
    const days =
      (Date.parse(approved.body.changeableUntil) - Date.parse(approved.body.answeredAt)) / 86_400_000;
    expect(days).toBe(7);
    const declined = await world.farmer.post(`/api/plans/${planId}/answer`, { answer: "decline" });
    expect(declined.body.status).toBe("declined");
  });

  it("the manager sees the verdict in the sites, without survey answers", async () => {
    const sites = await world.manager.get(`/api/cooperatives/${world.cooperative.id}/sites`);
    expect(sites.status).toBe(200);
    const row = sites.body.rows.find(
      (entry: { buildingId: string }) => entry.buildingId === world.buildingId,
    );
    expect(row.plan.status).toBe("declined");
    expect(row.plan.verdict).toBe("belowCritical");
    expect(row.canOpen).toBe(false);
    expect(JSON.stringify(row)).not.toContain("covers");
    expect((await world.manager.get(`/api/plans/${planId}`)).status).toBe(404);
    expect((await world.advisor.get(`/api/cooperatives/${world.cooperative.id}/sites`)).status).toBe(403);
  });

  it("a changed survey marks the plan as outdated and leaves it as it was", async () => {
    const before = (await world.advisor.get(`/api/plans/${planId}`)).body;
    const survey = (await world.advisor.get(`/api/buildings/${world.buildingId}/survey`)).body;
    survey.survey.covers.roof.cover = { value: "single-film", origin: "measured" };
    await world.advisor.put(`/api/buildings/${world.buildingId}/survey`, {
      version: survey.version,
      survey: survey.survey,
    });
    const after = (await world.advisor.get(`/api/plans/${planId}`)).body;
    expect(after.outdated).toBe(true);
    expect(after.result).toEqual(before.result);
    expect(after.survey).toEqual(before.survey);
    const next = await world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {});
    expect(next.body.number).toBe(2);
    expect(next.body.result.sizing.onceInYearsRequiredW).toBeGreaterThan(
      before.result.sizing.onceInYearsRequiredW,
    );
  });

  it("plans asked for at the same moment take numbers of their own", async () => {
    const answers = await Promise.all(
      Array.from({ length: 6 }, () => world.advisor.post(`/api/buildings/${world.buildingId}/plans`, {})),
    );
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201, 201, 201, 201]);
    expect(new Set(answers.map((answer) => answer.body.number)).size).toBe(6);
  });

  it("a preview keeps nothing", async () => {
    const { survey } = (await world.advisor.get(`/api/buildings/${world.buildingId}/survey`)).body;
    const plans = (await world.advisor.get(`/api/buildings/${world.buildingId}/plans`)).body.items.length;
    const preview = await world.advisor.post(`/api/buildings/${world.buildingId}/preview`, {
      survey,
      choices: {},
    });
    expect(preview.status).toBe(200);
    expect(preview.body.months).toHaveLength(12);
    expect((await world.advisor.get(`/api/buildings/${world.buildingId}/plans`)).body.items).toHaveLength(
      plans,
    );
  });
});
