import type { Permission, Role } from './permissions';

export interface PersonDto {
  id: string;
  name: string;
  email: string;
  role: Role;
  closed: boolean;
  /** ISO 8601, or `null` for never. */
  lastSignInAt: string | null;
}

export interface CreatePersonRequest {
  name: string;
  email: string;
  role: Role;
  /** At least 10 characters. */
  password: string;
}

export interface UpdatePersonRequest {
  name?: string;
  role?: Role;
}

export interface Preferences {
  lengths: 'feet' | 'metres';
  theme: 'light' | 'dark' | 'system';
}

/** The person who is signed in. */
export interface AccountDto extends PersonDto {
  preferences: Preferences;
  permissions: Permission[];
}

/** Only what is given changes. */
export interface UpdateAccountRequest {
  name?: string;
  preferences?: Partial<Preferences>;
}

export interface SignInRequest {
  email: string;
  password: string;
  /** How the person would recognise this tablet in a list. */
  deviceName?: string;
}

export interface ChangePasswordRequest {
  current: string;
  next: string;
}

/** A device with a session that can be ended. */
export interface SessionDto {
  id: string;
  deviceName: string;
  createdAt: string;
  lastUsedAt: string;
  /** True for the device that asks. */
  current: boolean;
}
