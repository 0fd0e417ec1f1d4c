import { FrontPage } from '../features/signing-in/FrontPage';
import { SignInForm } from '../features/signing-in/SignInForm';

export function Component() {
  return <FrontPage title="Sign in"><SignInForm /></FrontPage>;
}
