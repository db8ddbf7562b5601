/** The cookie that carries a session's secret. */
export const sessionCookie = 'coldbench_session';

/** A session that is used lasts on; one that is not ends after this many days. Judgement, no source. */
export const sessionDays = 30;

export const sessionMaxAge = sessionDays * 86_400_000;

/** The cookie that ties a visitor's attempt to the browser it was begun in. */
export const visitorCookie = 'coldbench_visitor';

export const visitorMaxAge = 30 * 86_400_000;
