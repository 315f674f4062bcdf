import type { Profile } from "passport-google-oauth20";
import { Person } from "../../models/person.ts";

/**
 * The person a sign-in belongs to: by the identity service's own number, or, the first time, by a verified e-mail address that
 * a manager has invited. Nobody is created here.
 */
export async function personForProfile(profile: Profile): Promise<Person | null> {
  const known = await Person.findOne({ where: { googleSub: profile.id } });
  if (known !== null) return seen(known);
  const email = profile.emails?.find((entry) => entry.verified)?.value.toLowerCase();
  if (email === undefined) return null;
  const invited = await Person.findOne({ where: { email, googleSub: null } });
  if (invited === null) return null;
  invited.googleSub = profile.id;
  return seen(invited);
}

async function seen(person: Person): Promise<Person> {
  person.lastSeenAt = new Date();
  return person.save();
}
