export function signInByForm(
  address: string,
  email: string,
  password: string,
  options?: { device?: string },
): Promise<string>;
export function signOutByForm(address: string, cookie: string, origin?: string): Promise<void>;
