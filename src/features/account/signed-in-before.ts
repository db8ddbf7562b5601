const key = 'coldbench:signed-in';

/**
 * Whether somebody signed in from this browser and has not signed out: only a hint that asking the server
 * is worth while. The session itself is in a cookie that no script can read.
 */
export const signedInBefore = (): boolean => {
  try {
    return localStorage.getItem(key) !== null;
  } catch {
    return true;
  }
};

/** Without storage every page asks, which is only slower. */
export const rememberSignedIn = (isSignedIn: boolean): void => {
  try {
    if (isSignedIn) localStorage.setItem(key, 'yes');
    else localStorage.removeItem(key);
  } catch {
    // Storage is refused in this browser: the hint is not needed to work.
  }
};
