'use client';

export { PageError as default } from '@/components/shell/page-error';
