/** Where to go after signing in: the `then` of the address if it is a path of ours, else `usual`. */
export const nextPath = (then: string | null, usual: string): string =>
  then !== null && /^\/(?![/\\])/.test(then) ? then : usual;
