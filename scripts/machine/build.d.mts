export function sourcesFingerprint(): string;
export function buildIfChanged(options?: {
  env?: Record<string, string>;
  distDir?: string;
}): boolean;
