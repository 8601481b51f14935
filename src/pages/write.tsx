import type { QueryClient } from '@tanstack/react-query';
import type { ActionFunction, LoaderFunction } from 'react-router-dom';

export function makeLoader(_client: QueryClient): LoaderFunction { return () => null; }
export function makeAction(_client: QueryClient): ActionFunction { return () => null; }
export function Component() { return null; }
