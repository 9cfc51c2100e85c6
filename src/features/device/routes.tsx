import type { RouteObject } from 'react-router-dom';
import { paths } from '../../app/paths';
import { DevicePage } from './DevicePage';

/** *This device*: open without a PIN, because it is where a person gets one. */
export const deviceRoutes: RouteObject[] = [{ path: paths.device, Component: DevicePage }];
