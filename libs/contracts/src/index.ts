export type { DemoDto } from './demo';
export type {
  AccountDto,
  ChangePasswordRequest,
  CreatePersonRequest,
  PersonDto,
  Preferences,
  SessionDto,
  SignInRequest,
  UpdateAccountRequest,
  UpdatePersonRequest,
} from './people';
export { may, PERMISSIONS, ROLES } from './permissions';
export type { Permission, Role } from './permissions';
export type { Page, PageQuery } from './paging';
export type { PlanDto, PlanSummaryDto, WritePlanRequest } from './plans';
export type { FieldProblem, Problem, ProblemReason } from './problems';
export type {
  TrailerDto,
  TrailerListQuery,
  UpdateTrailerRequest,
  WriteTrailerRequest,
} from './trailers';
export type {
  AppendEventsRequest,
  AppendEventsResponse,
  AppendResult,
  OpenTraceRequest,
  TraceDto,
  TraceListQuery,
  TraceSummaryDto,
} from './traces';
