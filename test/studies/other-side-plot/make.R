# Overall coefficients of a double pipe, water in the tube at several flows, three campaigns with their own constant rest; both sides by nls on ln U. Invented.
set.seed(3)
di <- 0.020; do <- 0.025; lambda <- 0.62; mu <- 7.5e-4; rho <- 995
u <- rep(c(0.4, 0.6, 0.9, 1.4, 2.0, 2.8), 3)
week <- rep(c("w1", "w2", "w3"), each = 6)
rest <- c(w1 = 2.5e-4, w2 = 3.1e-4, w3 = 3.8e-4)
Re <- rho * u * di / mu
U <- round(1 / (rest[week] + (do / di) / (0.055 * Re^0.75 * lambda / di)) * exp(0.01 * rnorm(length(u))), 2)
run <- paste0("R", seq_along(u))
write.csv(data.frame(run, week, `u [m/s]` = u, `U [W/(m^2 K)]` = U, check.names = FALSE), "trials.csv", row.names = FALSE, quote = FALSE)
w <- match(week, c("w1", "w2", "w3"))
fit <- nls(log(U) ~ -log(R[w] / 1e4 + 1 / (s * C * (Re / 1e4)^a)), start = list(R = rep(2, 3), C = 46, a = 0.8),
           data = list(U = U, Re = Re, w = w, s = lambda / di * di / do), control = nls.control(tol = 1e-7, maxiter = 200))
# in units that suit nls: R in 1e-4 m^2 K/W, C for Re/1e4; back by the chain rule
V <- vcov(fit); p <- coef(fit); C <- p["C"] / 1e4^p["a"]
J <- diag(c(1e-4, 1e-4, 1e-4, C / p["C"], 1)); J[4, 5] <- -C * log(1e4)
b <- cbind(c(p[1:3] * 1e-4, C, p["a"]), sqrt(diag(J %*% V %*% t(J))))
names <- c("other_side_resistance_1", "other_side_resistance_2", "other_side_resistance_3", "C", "a")
pairs <- function(v) paste0('"', names, '": ', sprintf("%.12g", v), collapse = ", ")
trials <- paste0('"', run, '": {"U": ', U, ', "Re": ', sprintf("%.15g", Re), '}', collapse = ",\n  ")
cat(sprintf('{\n "made_by": "make.R",\n "versions": {"R": "%s"},\n "trials": {\n  %s\n },\n "law": {"values": {%s},\n  "standard_errors": {%s},\n  "residual_sd": %.12g},\n "notes": ["after Wilson 1915", "all else in campaign w2"],\n "sides": {"w1": %.12g, "w2": %.12g, "w3": %.12g},\n "tolerance": {"law": 1e-5}\n}\n',
            getRversion(), trials, pairs(b[, 1]), pairs(b[, 2]), summary(fit)$sigma, b[1, 1], b[2, 1], b[3, 1]), file = "expected.json")
