const escapes: Readonly<Record<string, string>> = {
  '<': '\\u003c',
  '\u2028': '\\u2028',
  '\u2029': '\\u2029',
};

/** JSON that may stand inside a `<script type="application/json">`: no text in it can end the element. */
export function jsonForScript(value: unknown): string {
  return JSON.stringify(value).replace(/[<\u2028\u2029]/g, (sign) => escapes[sign] ?? sign);
}
