/* global OfficeExt, OSF */
// Stands where the host library looks for its support of hosts from before 2016. No such host runs custom functions, so the
// only page that gets here is one opened in a plain browser: say so, and Office.onReady resolves with no host. What the
// library ships in this place also opens a frame for telemetry.
OfficeExt.MsAjaxError = {};
OSF.OUtil = { parseXdmInfo: () => null };
