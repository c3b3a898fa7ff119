export interface Ports {
  http: number;
  mailbox: number;
  smtp: number;
  postgres: number;
}

export interface SignIn {
  role: string;
  email: string;
  password: string;
  workshop?: string;
}

export interface Product {
  baseUrl: string;
  mailboxUrl: string;
  databaseUrls: { app: string; owner: string; admin: string };
  signIns: SignIn[];
  stop(): Promise<void>;
}

/** Starts the built product for a test, with the demo and the test hooks, on throw-away data. */
export function startProduct(options?: { dir?: string; ports?: Ports; dist?: string }): Promise<Product>;
