/** The demo panels, each with all its points in scope, as the server would hand them to the checklist generator. */
import type { ChecklistInput } from '../../shared/checklist/facts';

export const inputsOfDemoPanels = (): [string, ChecklistInput][] => [];
