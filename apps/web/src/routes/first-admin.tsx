import { FirstAdminForm } from '../features/signing-in/FirstAdminForm';
import { FrontPage } from '../features/signing-in/FrontPage';

export function Component() {
  return <FrontPage title="The first account"><FirstAdminForm /></FrontPage>;
}
