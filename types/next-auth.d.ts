import "next-auth";
import "next-auth/jwt";

declare module "next-auth" {
  interface User {
    epoch: number;
  }
  interface Session {
    personId?: string;
    epoch?: number;
  }
}

declare module "next-auth/jwt" {
  interface JWT {
    personId?: string;
    epoch?: number;
  }
}
