import { endOtherDevicesRoute } from "@/app/_server/accounts/devices";

export const DELETE = endOtherDevicesRoute;
