export const chromiumLaunch: { readonly executablePath: string; readonly args: string[] };
export function requireChromium(): void;
