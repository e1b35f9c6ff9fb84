import type { Transaction } from '@/db/database';
import type { PersonContext } from '@/server/base/context';

class Trial<T> extends Error {
  constructor(readonly result: T) {
    super('only tried');
  }
}

/** Does a change, or does it and takes it all back: what a trial tells is then what the change would do. */
export async function keepOrTry<T>(
  ctx: PersonContext,
  isTrial: boolean,
  change: (tx: Transaction) => Promise<T>,
): Promise<T> {
  try {
    return await ctx.db.transaction(async (tx) => {
      const result = await change(tx);
      if (isTrial) throw new Trial(result);
      return result;
    });
  } catch (error) {
    if (error instanceof Trial) return error.result as T;
    throw error;
  }
}
