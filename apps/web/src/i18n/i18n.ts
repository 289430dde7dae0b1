import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { catalogue } from './catalogue';

/** Words are part of the bundle, so there is no moment without them. */
await i18next.use(initReactI18next).init({
  lng: 'en',
  fallbackLng: 'en',
  defaultNS: 'common',
  resources: { en: catalogue },
  // React escapes.
  interpolation: { escapeValue: false },
  returnNull: false,
});

export default i18next;
