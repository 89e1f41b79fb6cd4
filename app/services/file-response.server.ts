/** Names are made safe for the header and kept whole in its extended form (RFC 6266, RFC 8187). */
function contentDisposition(kind: "attachment" | "inline", name: string): string {
  const plain = name.replace(/[^\x20-\x7e]|["\\%]/g, "_");
  const extended = encodeURIComponent(name).replace(/['()*]/g, (c) => `%${c.charCodeAt(0).toString(16).toUpperCase()}`);
  return `${kind}; filename="${plain}"; filename*=UTF-8''${extended}`;
}

interface FileFacts {
  name: string;
  type: string;
  kind?: "attachment" | "inline";
  headers?: Record<string, string>;
}

export function fileResponse(body: Uint8Array | string, { name, type, kind, headers }: FileFacts): Response {
  return new Response(typeof body === "string" ? body : new Uint8Array(body), {
    headers: {
      "Content-Type": type,
      "Content-Disposition": contentDisposition(kind ?? "attachment", name),
      "Cache-Control": "private, no-store",
      "X-Content-Type-Options": "nosniff",
      ...headers,
    },
  });
}
