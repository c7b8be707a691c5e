/** Of every invented person; npm start prints it. It protects nothing but the demonstration. */
export const demonstrationPassword = "Weather-Vane-7-Brass";
