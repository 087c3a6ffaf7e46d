const BROWSERS: readonly [RegExp, string][] = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(?:Firefox|FxiOS)\//, 'Firefox'],
  [/\b(?:Chrome|CriOS|HeadlessChrome)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
];
const SYSTEMS: readonly [RegExp, string][] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b|\bMacintosh\b/, 'macOS'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bLinux\b/, 'Linux'],
];

/**
 * What a browser calls itself, in the words of its user; empty where it says nothing known. For telling one's own
 * browsers apart, not for trusting.
 */
export function deviceOf(userAgent: string | undefined): string {
  const find = (table: readonly [RegExp, string][]) =>
    table.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1];
  const [browser, system] = [find(BROWSERS), find(SYSTEMS)];
  return browser && system ? `${browser} on ${system}` : (browser ?? system ?? '');
}
