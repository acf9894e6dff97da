import type { HandlersOf } from '#server/http/handler.ts';
import type { account } from '#shared/contracts/account.ts';
import { acceptWelcome } from './accept-welcome.ts';
import { changePassword } from './change-password.ts';
import { sessionStateOf } from './session-state.ts';
import { showWelcome } from './show-welcome.ts';
import { signIn } from './sign-in.ts';
import { signOut } from './sign-out.ts';

export const accountHandlers: HandlersOf<typeof account> = {
  showSession: sessionStateOf,
  signIn,
  signOut,
  changePassword,
  showWelcome,
  acceptWelcome,
};
