/**
 * Hardware and supplies that are counted, as `h`: what is used, and what is left of what is not any more. A kit has
 * no stock of its own: its parts are counted.
 */
export const countedHardware = `hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE (h.active = 1 OR b.on_hand > 0) AND NOT EXISTS (SELECT 1 FROM kit_part p WHERE p.kit_id = h.id)`;
