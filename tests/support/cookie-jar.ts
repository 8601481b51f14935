/** The cookies of one visitor of one site. */
export class CookieJar {
  readonly #cookies = new Map<string, string>();

  /** Keeps what an answer sets and drops what it ends. */
  keep(headers: Headers): void {
    for (const line of headers.getSetCookie()) {
      const [pair = '', ...attributes] = line.split(';');
      const [name = '', ...value] = pair.trim().split('=');
      if (hasEnded(attributes)) this.#cookies.delete(name);
      else this.#cookies.set(name, value.join('='));
    }
  }

  header(): string {
    return [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; ');
  }

  get(name: string): string | undefined {
    return this.#cookies.get(name);
  }
}

function hasEnded(attributes: readonly string[]): boolean {
  return attributes.some((attribute) => {
    const [name = '', value = ''] = attribute.trim().split('=');
    if (name.toLowerCase() === 'max-age') return Number(value) <= 0;
    return name.toLowerCase() === 'expires' && Date.parse(value) <= Date.now();
  });
}
