/** The roles a person may have; the database holds the same list. */
export type UserRole = "engineer" | "operator" | "toolroom" | "manager";

export interface User {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly role: UserRole;
  readonly passwordHash: string;
  /** Set: may no longer sign in, and open sessions end. */
  readonly disabledAt: Date | null;
  readonly createdAt: Date;
}
