/** Carries one sentence over a redirect. Readable by scripts, which clear it once it is shown. */
export const saidCookie = 'eavewright-said';
