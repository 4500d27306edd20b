/** The header that makes a browser save a file under its own name, in any script (RFC 6266, RFC 8187). */
export function attachmentNamed(fileName: string): string {
  const encoded = encodeURIComponent(fileName).replace(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `attachment; filename*=UTF-8''${encoded}`;
}
