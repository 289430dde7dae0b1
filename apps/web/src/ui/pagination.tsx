import { chakra } from '@chakra-ui/react';
import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Button } from './button';

const Nav = chakra('nav', {
  base: {
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: 'touch',
    flexWrap: 'wrap',
  },
});
const Buttons = chakra('div', { base: { display: 'flex', gap: 'touch' } });
const Words = chakra('p', { base: { color: 'fg.muted' } });

export interface PaginationProps {
  page: number;
  size: number;
  total: number;
  onPage: (page: number) => void;
}

/** Which rows these are, and the way to the next ones. */
export function Pagination({ page, size, total, onPage }: PaginationProps) {
  const { t } = useTranslation();
  const last = Math.max(1, Math.ceil(total / size));
  const from = total === 0 ? 0 : (page - 1) * size + 1;
  return (
    <Nav aria-label={t('pages')}>
      <Words>{t('rowsShown', { from, to: Math.min(page * size, total), total })}</Words>
      {last > 1 && (
        <Buttons>
          <Button
            size="office"
            icon={ChevronLeft}
            disabled={page <= 1}
            onClick={() => onPage(page - 1)}
          >
            {t('previous')}
          </Button>
          <Button size="office" disabled={page >= last} onClick={() => onPage(page + 1)}>
            {t('next')}
            <ChevronRight size={20} aria-hidden />
          </Button>
        </Buttons>
      )}
    </Nav>
  );
}
