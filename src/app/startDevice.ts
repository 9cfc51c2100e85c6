/** Starts what runs beside every page: sending what is unsent, and looking for newer versions. */
import '../offline/appUpdate';
import { device } from './device';

if (device.ok) device.store.start();
