import { endDeviceRoute } from "@/app/_server/accounts/devices";

export const DELETE = endDeviceRoute;
