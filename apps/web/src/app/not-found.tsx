import { useTranslation } from 'react-i18next';
import { paths } from '../lib/paths';
import { LinkButton, Page, PageHeader } from '../ui';

export function NotFound() {
  const { t } = useTranslation();
  return (
    <Page width="reading">
      <PageHeader title={t('notFoundTitle')} lead={t('notFoundWords')} />
      <div>
        <LinkButton to={paths.yard()} look="primary">
          {t('toTheYard')}
        </LinkButton>
      </div>
    </Page>
  );
}
