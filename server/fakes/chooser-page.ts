import type { DemoPerson } from "../database/demo/people.ts";

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (letter) => `&#${letter.charCodeAt(0)};`);
}

/** A plain page with one button per person; every other value of the sign-in request travels along unchanged. */
export function chooserPage(people: DemoPerson[], query: Record<string, string>): string {
  const carried = Object.entries(query)
    .filter(([name]) => name !== "login_hint")
    .map(([name, value]) => `<input type="hidden" name="${escaped(name)}" value="${escaped(value)}">`)
    .join("");
  const buttons = people
    .map(
      (person) =>
        `<li><button name="login_hint" value="${escaped(person.email)}"><b>${escaped(person.name)}</b> ${escaped(person.role)}, ${escaped(person.farm)}</button></li>`,
    )
    .join("");
  return `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>Stand-in for sign-in</title><link rel="icon" href="data:,">
<style>body{font:16px/1.5 system-ui;margin:2rem auto;max-width:34rem;padding:0 1rem}ul{list-style:none;padding:0}
button{font:inherit;width:100%;text-align:left;min-height:44px;margin:2px 0}</style>
<h1>Who signs in?</h1><p>This page stands in for the sign-in service. The people are invented.</p>
<form method="get" action="/authorize">${carried}<ul>${buttons}</ul></form></html>`;
}
