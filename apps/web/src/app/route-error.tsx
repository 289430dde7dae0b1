import { useTranslation } from 'react-i18next';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { paths } from '../lib/paths';
import { Button, LinkButton, Page, PageHeader } from '../ui';
import { NotFound } from './not-found';

/** What browsers say when a part of the program cannot be fetched, each in its own words. */
const unfetched = /dynamically imported module|importing a module script|module script failed/i;

/** Stands in for a screen that broke; the others go on. */
export function RouteError() {
  const error = useRouteError();
  const { t } = useTranslation();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFound />;
  const offline = error instanceof TypeError && unfetched.test(error.message);
  return (
    <Page width="reading">
      <PageHeader title={t('brokenTitle')} lead={t(offline ? 'newVersion' : 'brokenWords')} />
      <div>
        <Button look="primary" onClick={() => window.location.reload()}>
          {t('reload')}
        </Button>{' '}
        <LinkButton to={paths.yard()}>{t('toTheYard')}</LinkButton>
      </div>
    </Page>
  );
}
