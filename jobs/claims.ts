import { claimMail, type ClaimedMail, leaseMs, releaseMail, renewLeases } from '@/db/queries/mail';

/** Mails taken from the outbox at one time. */
const bite = 100;

/** What one run holds of the outbox: takes some at a time, at most `most` in all, renews what it holds, and gives back what it did not try. */
export function holdClaims(clock: () => Date, most: number) {
  let left = most;
  let ahead: ClaimedMail[] = [];
  const inHand = new Set<ClaimedMail>();
  const renew = () => {
    try {
      renewLeases([...ahead, ...inHand], clock());
    } catch {
      // The next turn tries again, long before the lease runs out.
    }
  };
  const timer = setInterval(renew, leaseMs / 10);
  timer.unref();
  return {
    /** The next mail, or undefined when none is due or the run's share is used up. */
    next(): ClaimedMail | undefined {
      if (ahead.length === 0 && left > 0) {
        ahead = claimMail(clock(), Math.min(bite, left));
        left -= ahead.length;
      }
      const one = ahead.shift();
      if (one) inHand.add(one);
      return one;
    },
    done: (one: ClaimedMail) => void inHand.delete(one),
    /** Back to the outbox with everything that was taken and not tried. If that cannot be written, it is free when its lease runs out. */
    end() {
      clearInterval(timer);
      const untried = ahead;
      ahead = [];
      releaseMail(untried);
    },
  };
}
