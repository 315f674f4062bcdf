import type { Letter } from "./mailer.ts";

interface Addressee {
  name: string;
  email: string;
}

function letter(to: Addressee, subject: string, lines: string[]): Letter {
  return {
    to: `"${to.name.replaceAll('"', "")}" <${to.email}>`,
    subject,
    text: [`${to.name},`, "", ...lines].join("\n"),
  };
}

export function invitationLetter(to: Addressee, cooperativeName: string, publicUrl: string): Letter {
  return letter(to, `${cooperativeName} invites you to Glassbyre`, [
    `${cooperativeName} plans the heating of its members' houses with Glassbyre and has added you.`,
    `Sign in with this e-mail address: ${publicUrl}`,
  ]);
}

export function planSentLetter(to: Addressee, from: string, buildingName: string, link: string): Letter {
  return letter(to, `A heating plan for ${buildingName}`, [
    `${from} has sent you a heating plan for ${buildingName}. You can approve it, ask about it or decline it:`,
    link,
  ]);
}

export function answerLetter(
  to: Addressee,
  from: string,
  words: string,
  buildingName: string,
  link: string,
): Letter {
  return letter(to, `${buildingName}: ${words}`, [
    `${from} has answered your plan for ${buildingName}: ${words}.`,
    link,
  ]);
}

export function messageLetter(to: Addressee, from: string, buildingName: string, link: string): Letter {
  return letter(to, `A message about ${buildingName}`, [
    `${from} has written about the plan for ${buildingName}:`,
    link,
  ]);
}
