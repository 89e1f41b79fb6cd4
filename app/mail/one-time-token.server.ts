import { Op, type Transaction } from "sequelize";
import { hashToken, newId, newToken } from "~/db/id.server";
import { OneTimeToken, type TokenPurpose } from "~/db/models/one-time-token.server";

/** A link to be sent; earlier ones of the same purpose and subject open nothing from now on. */
export async function prepareToken(
  purpose: TokenPurpose,
  subjectId: string,
  lifetimeMs: number,
  transaction: Transaction,
): Promise<string> {
  await revokeTokens(purpose, subjectId, transaction);
  const values = { purpose, subjectId, tokenHash: null, expiresAt: new Date(Date.now() + lifetimeMs), usedAt: null };
  return (await OneTimeToken.create({ id: newId(), ...values }, { transaction })).id;
}

export async function revokeTokens(purpose: TokenPurpose, subjectId: string, transaction: Transaction): Promise<void> {
  await OneTimeToken.destroy({ where: { purpose, subjectId }, transaction });
}

/** Makes the token that a mail carries; a mail that is tried again carries a new one. Null where the link is void. */
export async function issueToken(id: string): Promise<string | null> {
  const token = newToken();
  const [count] = await OneTimeToken.update(
    { tokenHash: hashToken(token) },
    { where: { id, usedAt: null, expiresAt: { [Op.gt]: new Date() } } },
  );
  return count === 1 ? token : null;
}

/** Whom a link is for, while it is good; null where it was never made, has run out, was replaced or used. */
export async function subjectOfToken(purpose: TokenPurpose, token: string): Promise<string | null> {
  const found = await OneTimeToken.findOne({
    where: { purpose, tokenHash: hashToken(token), usedAt: null, expiresAt: { [Op.gt]: new Date() } },
  });
  return found?.subjectId ?? null;
}

/** Uses the link up. Of several who come with it at once, one gets the subject and the others null. */
export async function spendToken(
  purpose: TokenPurpose,
  token: string,
  transaction: Transaction,
): Promise<string | null> {
  const now = new Date();
  const where = { purpose, tokenHash: hashToken(token), usedAt: null, expiresAt: { [Op.gt]: now } };
  const found = await OneTimeToken.findOne({ where, transaction });
  if (!found) return null;
  const [count] = await OneTimeToken.update({ usedAt: now }, { where: { ...where, id: found.id }, transaction });
  return count === 1 ? found.subjectId : null;
}
