# Michaelis-Menten on ../law-comparison/puromycin.csv, by R. usage: Rscript puromycin.r   Writes puromycin.r.csv beside itself; R 4.2.2 with minpack.lm.
library(minpack.lm)
options(digits = 17)
d <- setNames(read.csv("../law-comparison/puromycin.csv"), c("concentration", "rate")); n <- nrow(d); p <- 2
tight <- nls.lm.control(ftol = 1e-16, ptol = 1e-16, maxiter = 1000)
rows <- list(); add <- function(quantity, value) rows[[length(rows) + 1]] <<- data.frame(quantity, value = formatC(as.numeric(value), digits = 15, format = "g"))

fit <- nlsLM(rate ~ Vm * concentration / (K + concentration), d, start = c(Vm = 200, K = 0.05), control = tight)
b <- coef(fit); V <- vcov(fit); se <- sqrt(diag(V)); rss <- deviance(fit); s <- sqrt(rss / (n - p))
for (k in names(b)) add(k, b[k])
for (k in names(b)) add(paste("se", k), se[k])
add("correlation", cov2cor(V)[1, 2]); add("residual sum of squares", rss); add("residual sd", s); add("df", n - p)
for (k in names(b)) { add(paste(k, "Wald 95 % low"), b[k] - qt(.975, n - p) * se[k]); add(paste(k, "Wald 95 % high"), b[k] + qt(.975, n - p) * se[k]) }

# Exact profiles: the least sum of squares at a held parameter, solved for a rise of t^2 s^2.
rise <- function(which, v) {
  q <- if (which == "Vm") optimize(function(K) sum((d$rate - v * d$concentration / (K + d$concentration))^2), c(1e-4, 2), tol = 1e-14)$objective
       else { x <- d$concentration / (v + d$concentration); sum((d$rate - sum(x * d$rate) / sum(x^2) * x)^2) }
  (q - rss) / s^2 - qt(.975, n - p)^2
}
limit <- function(which, a, z) uniroot(function(v) rise(which, v), c(a, z), tol = 1e-13)$root
add("Vm profile 95 % low", limit("Vm", 150, b[1])); add("Vm profile 95 % high", limit("Vm", b[1], 300))
add("K profile 95 % low", limit("K", .02, b[2])); add("K profile 95 % high", limit("K", b[2], .2))

g <- c(.1 / (b[2] + .1), -b[1] * .1 / (b[2] + .1)^2)
add("rate at concentration 0.1", b[1] * .1 / (b[2] + .1)); add("delta-method se of rate at concentration 0.1", sqrt(t(g) %*% V %*% g))

w <- nlsLM(rate ~ Vm * concentration / (K + concentration), d, start = b, weights = 1 / rate, control = tight)
W <- vcov(w); known <- W / (deviance(w) / (n - p)); name <- function(q) paste("weights 1/rate:", q)
add(name("Vm"), coef(w)[1]); add(name("K"), coef(w)[2])
add(name("se Vm scale estimated"), sqrt(W[1, 1])); add(name("se K scale estimated"), sqrt(W[2, 2])); add(name("WSS"), deviance(w))
add(name("se Vm scale known"), sqrt(known[1, 1])); add(name("se K scale known"), sqrt(known[2, 2]))
write.csv(do.call(rbind, rows), "puromycin.r.csv", row.names = FALSE, quote = FALSE)
