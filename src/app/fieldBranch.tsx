import type { RouteObject } from 'react-router-dom';
import { deviceRoutes } from '../features/device/routes';
import { fieldRoutes } from '../features/fieldwork/routes';
import { FieldGate } from './FieldGate';
import { withServer } from './withServer';

/** The pages that work without a network, behind the question whether this browser can keep them. */
export const fieldBranch: RouteObject[] = [
  { Component: FieldGate, children: [...fieldRoutes, withServer(deviceRoutes)] },
];
