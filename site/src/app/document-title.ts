import { museum } from '../config/museum';

export const documentTitle = (title: string): string => `${title} | ${museum.name}`;
