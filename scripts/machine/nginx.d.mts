export function requireNginx(): void;
export function startProxy(options: {
  port: number;
  instances: readonly string[];
}): Promise<{ readonly address: string; readonly stop: () => Promise<void> }>;
