import { Uri, type Webview } from 'vscode';

/** The page around the readout's bundle: nothing but our own script and style may load, nothing may leave. */
export function readoutPage(webview: Webview, dist: Uri): string {
  const nonce = newNonce();
  const script = webview.asWebviewUri(Uri.joinPath(dist, 'readout.js')).toString();
  const style = webview.asWebviewUri(Uri.joinPath(dist, 'readout.css')).toString();
  const policy = [
    "default-src 'none'",
    `img-src ${webview.cspSource} data:`,
    `font-src ${webview.cspSource}`,
    `style-src ${webview.cspSource} 'nonce-${nonce}'`,
    `script-src 'nonce-${nonce}'`,
  ].join('; ');
  // The control library adds a style element of its own and looks for the nonce in this property.
  return `<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${policy}">
<meta property="csp-nonce" content="${nonce}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Pulse readout</title>
<link rel="stylesheet" href="${style}">
</head>
<body>
<main id="readout"></main>
<script nonce="${nonce}" src="${script}"></script>
</body>
</html>`;
}

/** Of the web's own cryptography, which desktop and browser hosts have alike. */
function newNonce(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(18));
  return btoa(String.fromCharCode(...bytes));
}
