import * as archive from '@/app/api/archive/route';
import * as catalogueCodeTest from '@/app/api/catalogue/[code]/[test]/route';
import * as catalogueCodeTestValues from '@/app/api/catalogue/[code]/[test]/values/route';
import * as catalogueOwnId from '@/app/api/catalogue/own/[id]/route';
import * as catalogueOwnIdVersions from '@/app/api/catalogue/own/[id]/versions/route';
import * as catalogueOwnIdWithdrawal from '@/app/api/catalogue/own/[id]/withdrawal/route';
import * as catalogueOwn from '@/app/api/catalogue/own/route';
import * as catalogue from '@/app/api/catalogue/route';
import * as catalogueValuesIdAgreement from '@/app/api/catalogue/values/[id]/agreement/route';
import * as catalogueValuesImport from '@/app/api/catalogue/values/import/route';
import * as catalogueValuesCsv from '@/app/api/catalogue/values.csv/route';
import * as customersId from '@/app/api/customers/[id]/route';
import * as customers from '@/app/api/customers/route';
import * as evaluations from '@/app/api/evaluations/route';
import * as filesId from '@/app/api/files/[id]/route';
import * as files from '@/app/api/files/route';
import * as health from '@/app/api/health/route';
import * as instrumentsIdCalibrations from '@/app/api/instruments/[id]/calibrations/route';
import * as instrumentsId from '@/app/api/instruments/[id]/route';
import * as instruments from '@/app/api/instruments/route';
import * as invitationsId from '@/app/api/invitations/[id]/route';
import * as invitationsAccept from '@/app/api/invitations/accept/route';
import * as invitations from '@/app/api/invitations/route';
import * as jobsIdAsLeftLinks from '@/app/api/jobs/[id]/as-left-links/route';
import * as jobsIdCheck from '@/app/api/jobs/[id]/check/route';
import * as jobsIdComponents from '@/app/api/jobs/[id]/components/route';
import * as jobsIdConditions from '@/app/api/jobs/[id]/conditions/route';
import * as jobsIdHandIn from '@/app/api/jobs/[id]/hand-in/route';
import * as jobsIdPlan from '@/app/api/jobs/[id]/plan/route';
import * as jobsIdReopen from '@/app/api/jobs/[id]/reopen/route';
import * as jobsIdReports from '@/app/api/jobs/[id]/reports/route';
import * as jobsId from '@/app/api/jobs/[id]/route';
import * as jobsIdTemperatures from '@/app/api/jobs/[id]/temperatures/route';
import * as jobs from '@/app/api/jobs/route';
import * as machinesIdHistory from '@/app/api/machines/[id]/history/route';
import * as machinesIdNameplate from '@/app/api/machines/[id]/nameplate/route';
import * as machinesIdOwners from '@/app/api/machines/[id]/owners/route';
import * as machinesId from '@/app/api/machines/[id]/route';
import * as machines from '@/app/api/machines/route';
import * as membersId from '@/app/api/members/[id]/route';
import * as members from '@/app/api/members/route';
import * as organisation from '@/app/api/organisation/route';
import * as planTemplatesId from '@/app/api/plan-templates/[id]/route';
import * as planTemplates from '@/app/api/plan-templates/route';
import * as ready from '@/app/api/ready/route';
import * as reportsIdData from '@/app/api/reports/[id]/data/route';
import * as reportsIdPdf from '@/app/api/reports/[id]/pdf/route';
import * as reportsIdPhotosFileid from '@/app/api/reports/[id]/photos/[fileId]/route';
import * as reportsId from '@/app/api/reports/[id]/route';
import * as reportsIdSignatures from '@/app/api/reports/[id]/signatures/route';
import * as sheetsIdChanges from '@/app/api/sheets/[id]/changes/route';
import * as sheetsIdOperations from '@/app/api/sheets/[id]/operations/route';
import * as sheetsIdPassesPassid from '@/app/api/sheets/[id]/passes/[passId]/route';
import * as sheetsIdPasses from '@/app/api/sheets/[id]/passes/route';
import * as sheetsIdPhotosPhotoid from '@/app/api/sheets/[id]/photos/[photoId]/route';
import * as sheetsIdPhotos from '@/app/api/sheets/[id]/photos/route';
import * as sheetsId from '@/app/api/sheets/[id]/route';
import * as welcome from '@/app/api/welcome/route';

/** Every route of the interface; a test finds one that is missing here. */
export const describedRoutes = {
  '/api/archive': archive,
  '/api/catalogue/[code]/[test]': catalogueCodeTest,
  '/api/catalogue/own/[id]/versions': catalogueOwnIdVersions,
  '/api/catalogue/own/[id]/withdrawal': catalogueOwnIdWithdrawal,
  '/api/catalogue/own/[id]': catalogueOwnId,
  '/api/catalogue/own': catalogueOwn,
  '/api/catalogue/[code]/[test]/values': catalogueCodeTestValues,
  '/api/catalogue/values/[id]/agreement': catalogueValuesIdAgreement,
  '/api/catalogue/values/import': catalogueValuesImport,
  '/api/catalogue/values.csv': catalogueValuesCsv,
  '/api/catalogue': catalogue,
  '/api/customers/[id]': customersId,
  '/api/customers': customers,
  '/api/evaluations': evaluations,
  '/api/files/[id]': filesId,
  '/api/files': files,
  '/api/health': health,
  '/api/instruments/[id]/calibrations': instrumentsIdCalibrations,
  '/api/instruments/[id]': instrumentsId,
  '/api/instruments': instruments,
  '/api/invitations/[id]': invitationsId,
  '/api/invitations/accept': invitationsAccept,
  '/api/invitations': invitations,
  '/api/jobs/[id]/as-left-links': jobsIdAsLeftLinks,
  '/api/jobs/[id]/check': jobsIdCheck,
  '/api/jobs/[id]/components': jobsIdComponents,
  '/api/jobs/[id]/conditions': jobsIdConditions,
  '/api/jobs/[id]/hand-in': jobsIdHandIn,
  '/api/jobs/[id]/plan': jobsIdPlan,
  '/api/jobs/[id]/reopen': jobsIdReopen,
  '/api/jobs/[id]/reports': jobsIdReports,
  '/api/jobs/[id]': jobsId,
  '/api/jobs/[id]/temperatures': jobsIdTemperatures,
  '/api/jobs': jobs,
  '/api/machines/[id]/history': machinesIdHistory,
  '/api/machines/[id]/nameplate': machinesIdNameplate,
  '/api/machines/[id]/owners': machinesIdOwners,
  '/api/machines/[id]': machinesId,
  '/api/machines': machines,
  '/api/members/[id]': membersId,
  '/api/members': members,
  '/api/organisation': organisation,
  '/api/plan-templates/[id]': planTemplatesId,
  '/api/plan-templates': planTemplates,
  '/api/ready': ready,
  '/api/reports/[id]/data': reportsIdData,
  '/api/reports/[id]/photos/[fileId]': reportsIdPhotosFileid,
  '/api/reports/[id]/pdf': reportsIdPdf,
  '/api/reports/[id]': reportsId,
  '/api/reports/[id]/signatures': reportsIdSignatures,
  '/api/sheets/[id]/changes': sheetsIdChanges,
  '/api/sheets/[id]/operations': sheetsIdOperations,
  '/api/sheets/[id]/photos/[photoId]': sheetsIdPhotosPhotoid,
  '/api/sheets/[id]/photos': sheetsIdPhotos,
  '/api/sheets/[id]/passes/[passId]': sheetsIdPassesPassid,
  '/api/sheets/[id]/passes': sheetsIdPasses,
  '/api/sheets/[id]': sheetsId,
  '/api/welcome': welcome,
};
