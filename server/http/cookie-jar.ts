import type { CookieOptions, Request, Response } from 'express';

/** Cookies of one request, and those its answer sets: all HttpOnly, SameSite=Lax, Secure over https. */
export class CookieJar {
  readonly #request: Request;
  readonly #response: Response;

  constructor(request: Request, response: Response) {
    this.#request = request;
    this.#response = response;
  }

  read(name: string): string | null {
    for (const pair of (this.#request.headers.cookie ?? '').split(';')) {
      const at = pair.indexOf('=');
      if (at > 0 && pair.slice(0, at).trim() === name) return pair.slice(at + 1).trim();
    }
    return null;
  }

  /** `maxAge` in ms */
  set(name: string, value: string, maxAge: number): void {
    this.#response.cookie(name, value, { ...this.#options(), maxAge });
  }

  clear(name: string): void {
    this.#response.clearCookie(name, this.#options());
  }

  #options(): CookieOptions {
    return { httpOnly: true, sameSite: 'lax', path: '/', secure: this.#request.secure };
  }
}
