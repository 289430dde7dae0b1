import { defineConfig } from 'vitest/config';
import { libraryTest } from '../../tools/vitest.shared.mts';

export default defineConfig(libraryTest);
