import { paths } from '#src/config/paths.ts';
import type { Role } from '#shared/permissions/ability.ts';

export type NavItem = { readonly label: string; readonly to: string };

const HOME = { label: 'Home', to: paths.home.to() };
const ORDERS = { label: 'Work orders', to: paths.workOrders.to() };
const PLANNER = { label: 'Kit planner', to: paths.planner.to() };
const BATCHES = { label: 'Batches', to: paths.batches.to() };
const CHECK_FIRST = { label: 'Check', to: paths.checkFirstOrders.to() };
const REVIEW = { label: 'Review desk', to: paths.review.to() };
const CONCESSIONS = { label: 'Concessions', to: paths.concessions.to() };
const REGISTER = { label: 'Register', to: paths.register.to() };
const NONCONFORMITIES = { label: 'Nonconformities', to: paths.nonconformities.to() };
const LOTS = { label: 'Lots', to: paths.lots.to() };
const TRANSMITTALS = { label: 'Transmittals', to: paths.transmittals.to() };
const STANDARD = { label: 'Standard', to: paths.standard.to() };
const TRAIL = { label: 'Trail', to: paths.trail.to() };
const PEOPLE = { label: 'People', to: paths.people.to() };
const MAIL = { label: 'Mail', to: paths.mail.to() };
const JOBS = { label: 'Jobs', to: paths.jobs.to() };

/** What each role works with, most used first; the rest is reached from these. */
export const NAV: Readonly<Record<Role, readonly NavItem[]>> = {
  contractor: [HOME, ORDERS, CHECK_FIRST, PLANNER, BATCHES, REGISTER, STANDARD],
  inspector: [HOME, ORDERS, REVIEW, REGISTER, NONCONFORMITIES, LOTS, STANDARD, TRAIL],
  engineer: [HOME, CONCESSIONS, REGISTER, NONCONFORMITIES, LOTS, STANDARD, TRAIL],
  clerk: [HOME, ORDERS, REGISTER, TRANSMITTALS, NONCONFORMITIES, LOTS, STANDARD, TRAIL],
  auditor: [HOME, REGISTER, NONCONFORMITIES, LOTS, TRANSMITTALS, STANDARD, TRAIL],
  administrator: [HOME, ORDERS, PLANNER, BATCHES, LOTS, PEOPLE, NONCONFORMITIES, STANDARD, TRAIL, MAIL, JOBS],
};
