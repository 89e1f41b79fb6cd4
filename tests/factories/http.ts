/** Requests as a browser sends them, with the cookies it keeps. */
export class HttpClient {
  private readonly cookies = new Map<string, string>();

  constructor(readonly origin: string) {}

  private keep(response: Response): void {
    for (const line of response.headers.getSetCookie()) {
      const [name, ...value] = line.split(";", 1)[0].split("=");
      if (/max-age=0|expires=thu, 01 jan 1970/i.test(line)) this.cookies.delete(name);
      else this.cookies.set(name, value.join("="));
    }
  }

  private async send(path: string, init: RequestInit): Promise<Response> {
    const headers = new Headers(init.headers);
    const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join("; ");
    if (cookie) headers.set("Cookie", cookie);
    const response = await fetch(new URL(path, this.origin), { ...init, headers, redirect: "manual" });
    this.keep(response);
    return response;
  }

  get(path: string): Promise<Response> {
    return this.send(path, {});
  }

  /** A form sent from the product's own pages. */
  post(path: string, fields: Record<string, string> | FormData): Promise<Response> {
    const body = fields instanceof FormData ? fields : new URLSearchParams(fields);
    return this.send(path, { method: "POST", body, headers: { Origin: this.origin, "Sec-Fetch-Site": "same-origin" } });
  }

  /** As `post`, with headers of one's own. */
  postFrom(path: string, fields: Record<string, string>, headers: Record<string, string>): Promise<Response> {
    return this.send(path, { method: "POST", body: new URLSearchParams(fields), headers });
  }

  async signIn(email: string, password: string): Promise<this> {
    const response = await this.post("/sign-in", { email, password });
    if (response.status !== 302) throw new Error(`Signing in as ${email} answered ${response.status}.`);
    return this;
  }

  setCookie(name: string, value: string): void {
    this.cookies.set(name, value);
  }

  cookie(name: string): string | undefined {
    return this.cookies.get(name);
  }
}
