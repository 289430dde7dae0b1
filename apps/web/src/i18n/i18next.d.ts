import 'i18next';
import type { catalogue } from './catalogue';

declare module 'i18next' {
  interface CustomTypeOptions {
    defaultNS: 'common';
    resources: typeof catalogue;
  }
}
